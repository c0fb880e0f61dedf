import { Mark } from '@/components/ui/mark';
import type { Circuit } from '@/lib/schemas/circuit';

/** Open stops, cautions and advice of the live sheet; a dash where there is none. */
export function OpenCounts({ counts }: { readonly counts: Circuit['counts'] }) {
  if (!counts) return <span className="text-ink-2">not checked yet</span>;
  return (
    <span className="inline-flex gap-1">
      {(['stop', 'caution', 'advice'] as const).map((kind) => (
        <span key={kind} className="inline-flex w-9 items-center gap-[3px]">
          {counts[kind] > 0 ? <><Mark kind={kind} size={16} /><b className="font-mono text-xs font-bold">{counts[kind]}</b></> : <span aria-hidden="true" className="w-full text-center text-ink-2">–</span>}
        </span>
      ))}
    </span>
  );
}
