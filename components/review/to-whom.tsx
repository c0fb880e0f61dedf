import { Checkbox, Radio } from '@/components/ui/choice';
import { Initials } from '@/components/ui/initials';
import type { Member } from '@/lib/schemas/bench';
import type { PersonRef } from '@/lib/schemas/text';

interface ToWhomProps {
  readonly letter: string;
  /** Null while they load. */
  readonly members: readonly Member[] | null;
  readonly contributors: readonly PersonRef[];
  readonly self: string;
  readonly named: boolean;
  readonly onNamed: (named: boolean) => void;
  readonly reviewers: readonly string[];
  readonly onReviewers: (reviewers: readonly string[]) => void;
}

/** Who is asked: any mentor who made no part of it, or people by name. */
export function ToWhom({ letter, members, contributors, self, named, onNamed, reviewers, onReviewers }: ToWhomProps) {
  const made = new Set(contributors.map((person) => person.id));
  const mentors = (members ?? []).filter((member) => member.role === 'mentor' && !made.has(member.id));
  const others = (members ?? []).filter((member) => member.id !== self);
  const toggle = (id: string, on: boolean) => onReviewers(on ? [...reviewers, id] : reviewers.filter((one) => one !== id));
  return (
    <section aria-labelledby="to-whom" className="border-[1.5px] border-ink max-tablet:border-x-0 max-tablet:border-t-0">
      <h3 id="to-whom" className="silk flex h-9 items-center border-b-[1.5px] border-ink px-3 text-sm">To whom</h3>
      <fieldset>
        <legend className="sr-only">To whom</legend>
        <Radio name="whom" checked={!named} onChange={() => onNamed(false)} className="border-b border-rule px-3 py-3">
          <span className="block text-body font-semibold">Any mentor who made no part of {letter}</span>
          <span className="text-sm text-ink-2">{members === null ? 'Looking who that is.' : mentors.length === 0 ? 'This bench has none: it can be reviewed, not signed.' : `It waits for ${mentors.map((mentor) => mentor.name).join(' and ')}.`}</span>
        </Radio>
        <Radio name="whom" checked={named} onChange={() => onNamed(true)} className="px-3 py-3"><span className="text-body font-semibold">Named people only</span></Radio>
      </fieldset>
      {named ? (
        <ul aria-label="People of the bench" className="max-h-[320px] overflow-y-auto border-t border-ink">
          {others.map((member) => (
            <li key={member.id} className="border-b border-rule last:border-0">
              <Checkbox className="items-center! px-3 py-2" checked={reviewers.includes(member.id)} onChange={(event) => toggle(member.id, event.target.checked)}>
                <span className="flex items-center gap-2.5">
                  <Initials name={member.name} />
                  <span className="min-w-0 flex-1"><span className="block text-body leading-tight font-semibold">{member.name}</span><span className="text-xs text-ink-2">{member.role}{made.has(member.id) ? `; made part of ${letter}` : ''}</span></span>
                  <span className="text-sm text-ink-2">{member.role === 'mentor' && !made.has(member.id) ? 'can sign' : 'reviews, cannot sign'}</span>
                </span>
              </Checkbox>
            </li>
          ))}
        </ul>
      ) : null}
      <p className="border-t border-ink px-3 py-2 text-sm text-ink-2">Whoever is named may ask for changes.</p>
    </section>
  );
}
