import { Icon } from '@/components/ui/icon';

/** Zoom out, the scale, zoom in, fit. */
export function ZoomKeys({ scale, onZoom, onFit }: { readonly scale: number; readonly onZoom: (factor: number) => void; readonly onFit: () => void }) {
  const key = 'grid h-[26px] min-w-7 place-items-center hover:bg-film-2 max-tablet:size-target';
  return (
    <div role="group" aria-label="Zoom" className="absolute top-7 right-8 z-[5] inline-flex items-center rounded-key border border-edge bg-film font-mono text-xs text-ink max-tablet:top-auto max-tablet:right-3 max-tablet:bottom-3 print:hidden">
      <button type="button" aria-label="Zoom out" onClick={() => onZoom(0.8)} className={`${key} max-tablet:hidden`}><Icon name="minus" /></button>
      <span className="px-1.5 tracking-[-.03em] max-tablet:hidden">{Math.round(scale * 100)} %</span>
      <button type="button" aria-label="Zoom in" onClick={() => onZoom(1.25)} className={`${key} max-tablet:hidden`}><Icon name="plus" /></button>
      <button type="button" aria-label="Fit the drawing" onClick={onFit} className={`${key} border-l border-edge px-2 font-cond font-semibold tracking-[.03em] max-tablet:border-l-0`}><span className="max-tablet:sr-only">Fit</span><Icon name="fit" className="tablet:hidden" /></button>
    </div>
  );
}
