import { ButtonLink } from '@/components/ui/button-link';
import { SheetFrame } from '@/components/ui/sheet-frame';

/** A bench without a circuit: the next step, offered. */
export function BenchEmpty({ bench }: { readonly bench: string }) {
  const item = 'grid grid-cols-[1fr_150px] items-center gap-6 border-b border-rule py-[18px] max-tablet:grid-cols-1 max-tablet:gap-3';
  return (
    <SheetFrame columns={6} rows={4}>
      <div className="m-auto w-[min(680px,100%)] bg-film px-8 py-7 text-ink tablet:border-[1.5px] tablet:border-ink max-tablet:px-4">
        <h2 className="font-cond text-[40px] leading-[1.1] font-semibold tracking-[.01em] max-tablet:text-2xl">No circuit on this bench yet</h2>
        <p className="mt-2.5 mb-6 max-w-[52ch] text-lg text-ink-2">Each circuit gets a sheet, a margin, and a ladder of hold points. Put the first one down.</p>
        <ol className="border-t-[1.5px] border-ink">
          <li className={item}>
            <div><p className="text-lg font-semibold">Draw a new sheet</p><p className="max-w-[48ch] text-md text-ink-2">Start from an empty frame: the supply first, then the load, then the switch between them.</p></div>
            <ButtonLink href={`/benches/${bench}/new`} tone="primary" size="large">New sheet</ButtonLink>
          </li>
          <li className={item}>
            <div><p className="text-lg font-semibold">Bring one in</p><p className="max-w-[48ch] text-md text-ink-2">A SPICE deck: values and ratings come across, parts are placed and wired for you.</p></div>
            <ButtonLink href={`/benches/${bench}/new?from=deck`} size="large">From a deck</ButtonLink>
          </li>
        </ol>
      </div>
    </SheetFrame>
  );
}
