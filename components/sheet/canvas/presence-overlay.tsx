'use client';
import { hueOf, initialsOf } from '@/components/ui/initials';
import { partBoxOf } from '@/lib/document/geometry/pin-place';
import { indexOf } from '@/lib/document/geometry/sheet-index';
import type { Sheet } from '@/lib/document/records';
import type { PresenceEntry } from '@/realtime/presence-fields';

const fills = ['fill-ra', 'fill-ink-2', 'fill-io', 'fill-th'] as const;
const strokes = ['stroke-ra', 'stroke-ink-2', 'stroke-io', 'stroke-th'] as const;

/** Where the others point and what they have chosen: a hue, and always their initials. */
export function PresenceOverlay({ others, sheet }: { readonly others: readonly PresenceEntry[]; readonly sheet: Sheet }) {
  const index = indexOf(sheet);
  return (
    <svg aria-hidden="true" className="pointer-events-none absolute top-0 left-0 z-[5] size-px overflow-visible">
      {others.map((other) => {
        const initials = other.name.length <= 3 ? other.name.toUpperCase() : initialsOf(other.name);
        const hue = hueOf(initials);
        const tag = (
          <g>
            <rect width="26" height="20" rx="2" className={fills[hue] ?? fills[0]} />
            <text x="13" y="14" textAnchor="middle" className="fill-on-person font-cond text-xs font-semibold tracking-[.04em]">{initials}</text>
          </g>
        );
        const boxes = (other.fields?.selection ?? []).flatMap((id) => {
          const part = index.part.get(id);
          return part ? [{ id, box: partBoxOf(part) }] : [];
        });
        return (
          <g key={other.connection} data-person={initials}>
            {boxes.map(({ id, box }) => <rect key={id} x={box.left - 5} y={box.top - 5} width={box.right - box.left + 10} height={box.bottom - box.top + 10} className={`fill-none ${strokes[hue] ?? strokes[0]}`} strokeWidth="1.2" strokeDasharray="4 3" />)}
            {other.fields?.cursor ? (
              <g transform={`translate(${other.fields.cursor.x} ${other.fields.cursor.y})`}>
                <path d="M0 0L5 16L8.5 9.5L16 7Z" className={fills[hue] ?? fills[0]} />
                <g transform="translate(14 14)">{tag}</g>
              </g>
            ) : null}
          </g>
        );
      })}
    </svg>
  );
}
