import { monoWords } from '@/components/ui/mono-words';
import { formatQuantity } from '@/lib/netlist/quantity/format-quantity';
import type { Evidence } from '@/lib/netlist/findings/finding';

function valueWords(value: Evidence['value'], unit: string): string {
  return typeof value === 'number' ? monoWords(formatQuantity(value, unit, 3)) : String(value);
}

/** The facts a verdict rests on: from these alone it can be computed again. */
export function EvidenceTable({ evidence }: { readonly evidence: readonly Evidence[] }) {
  return (
    <details className="mt-1 mr-2.5 text-xs text-ink-2">
      <summary className="w-max cursor-pointer font-cond font-semibold tracking-[.03em] text-act max-tablet:py-3">Evidence</summary>
      <dl className="mt-1">
        {evidence.map((fact, index) => (
          <div key={index} className="grid grid-cols-[1fr_auto] gap-x-3 border-t border-rule py-1">
            <dt className="min-w-0"><b className="font-mono text-ink">{fact.entity}</b> {fact.quantity}<span className="block">{fact.source}</span></dt>
            <dd className="text-right"><span className="figure text-ink">{valueWords(fact.value, fact.unit)}</span>{fact.limit === undefined ? null : <span className="block">limit <span className="figure">{valueWords(fact.limit, fact.unit)}</span>{fact.limitSource ? <span className="block">{fact.limitSource}</span> : null}</span>}</dd>
          </div>
        ))}
      </dl>
    </details>
  );
}
