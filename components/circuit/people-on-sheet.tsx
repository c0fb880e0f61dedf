import { Initials } from '@/components/ui/initials';

export interface PersonHere {
  readonly connection: string;
  readonly name: string;
  readonly away: boolean;
}

/** Who has the sheet open now. */
export function PeopleOnSheet({ people }: { readonly people: readonly PersonHere[] }) {
  if (people.length === 0) return null;
  const shown = people.slice(0, 5);
  return (
    <div className="flex items-center gap-1.5">
      <span className="silk text-silk-2 mr-1 font-medium max-wide:hidden">On the sheet</span>
      <ul className="flex gap-1.5" aria-label="On the sheet">{shown.map((person) => <li key={person.connection} className="flex"><Initials name={person.name} away={person.away} /></li>)}</ul>
      {people.length > shown.length ? <span className="text-xs text-silk-2">+{people.length - shown.length}</span> : null}
    </div>
  );
}
