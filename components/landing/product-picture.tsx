import { SheetDrawing } from '@/components/drawing/sheet-drawing';
import { LadderDrawing } from '@/components/ladder/ladder-drawing';
import { ladderPoints } from '@/components/ladder/ladder-point';
import { ladderScale } from '@/components/ladder/ladder-scale';
import { LeaderLines } from '@/components/margin/leader-lines';
import { fromWords, splitMessage } from '@/components/margin/finding-words';
import { marginEntries } from '@/components/margin/margin-entry';
import { stopFlags } from '@/components/margin/stop-flags';
import { Figures } from '@/components/ui/figures';
import { HatchTag } from '@/components/ui/hatch-tag';
import { Mark } from '@/components/ui/mark';
import type { Sheet } from '@/lib/document/records';
import type { LandingPicture } from './landing-picture';
import { layOutPicture, pictureSize, pictureView } from './picture-layout';

interface ProductPictureProps {
  readonly sheet: Sheet;
  readonly check: LandingPicture;
}

const tones = { stop: 'text-stop-ink border-stop', caution: 'text-caution-ink border-caution-ink', advice: 'text-ink border-ink-2', undetermined: 'text-act border-act' } as const;
const words = { stop: 'Stop', caution: 'Caution', advice: 'Advice', undetermined: 'Undetermined' } as const;
const nothingSigned = { to: null, past: null, struck: null, words: 'Nothing signed off', short: 'NONE' } as const;

/** The demo circuit as the product shows it: its ladder, its drawing, what the checks say of it. */
export function ProductPicture({ sheet, check }: ProductPictureProps) {
  const plan = sheet.holdPoints;
  const points = ladderPoints(plan.map(({ name, volts, amps }) => ({ name, volts, amps })));
  const last = points.at(-1);
  const findings = marginEntries(check.findings, []).flatMap((entry) => (entry.kind === 'note' ? [] : [entry]));
  const shown = findings.slice(0, 4);
  const { placed, leaders } = layOutPicture(sheet, shown);
  const width = pictureSize.drawing + pictureSize.margin;
  const flags = stopFlags(findings, plan);
  return (
    <div className="overflow-hidden border border-edge bg-film text-ink shadow-lift" style={{ maxWidth: width + 2 }}>
      <div className="groove-b bg-panel">
        <svg width={width} height="80" viewBox={`0 0 ${width} 80`} aria-hidden="true" className="block max-tablet:hidden"><LadderDrawing points={points} shown={last?.name ?? null} signed={nothingSigned} flags={flags} scale={ladderScale(points, 104, width - 48)} width={width} narrow={false} /></svg>
        <svg viewBox="0 0 358 80" aria-hidden="true" className="block w-full tablet:hidden"><LadderDrawing points={points} shown={last?.name ?? null} signed={nothingSigned} flags={flags} scale={ladderScale(points, 14, 314)} width={358} narrow /></svg>
      </div>
      <p className="flex min-h-7 items-center gap-3 border-b border-ink px-4 text-xs"><HatchTag /><span><b className="font-mono font-bold">{last?.name}</b>: isolate, limit current, discharge and prove dead, one hand, never alone.</span></p>
      <div className="relative flex max-tablet:block" style={{ minHeight: pictureSize.height }}>
        <div className="drafting-grid flex-none overflow-hidden border-r border-ink max-tablet:border-r-0 max-tablet:border-b" style={{ width: pictureSize.drawing, maxWidth: '100%', height: pictureSize.height }}>
          <svg width={pictureSize.drawing} height={pictureSize.height} role="img" aria-label="Part of the schematic: a MOSFET with its gate network, an induction coil, its diode and an indicator" className="block">
            <g transform={`scale(${pictureView.scale}) translate(${-pictureView.x} ${-pictureView.y})`}><SheetDrawing sheet={sheet} volts={check.volts} within={{ left: pictureView.x, top: pictureView.y, right: pictureView.x + pictureSize.drawing / pictureView.scale, bottom: pictureView.y + pictureSize.height / pictureView.scale }} /></g>
          </svg>
        </div>
        <div className="max-wide:hidden"><LeaderLines leaders={leaders} width={pictureSize.drawing + 24} height={pictureSize.height} /></div>
        <div className="relative min-w-0 flex-1 max-tablet:space-y-2 max-tablet:py-2">
          {placed.map(({ entry, top }) => {
            const { head, rest } = splitMessage(entry.finding.message);
            return (
              <article key={entry.key} className="inset-x-0 pr-3 pl-3 text-sm leading-[1.34] tablet:absolute" style={{ top }}>
                <h2 className={`-ml-3 flex h-[26px] items-center gap-[7px] border-b pr-1.5 pl-3 font-cond text-sm font-semibold tracking-[.04em] ${tones[entry.kind]}`}>
                  <Mark kind={entry.kind} label={entry.number} silent /><span className="flex-1 uppercase">{words[entry.kind]}</span>
                  <span className="font-mono text-xs font-normal tracking-[-.02em] text-ink-2">{fromWords(entry.finding, plan)}</span>
                </h2>
                <p className={entry.kind === 'stop' ? 'mt-[5px] text-body leading-tight font-semibold' : 'mt-[3px]'}><Figures>{head}</Figures></p>
                {rest ? <p className="mt-[3px] text-ink-2"><Figures>{rest}</Figures></p> : null}
                {entry.kind === 'stop' && entry.finding.remedy ? <p className="mt-[3px] text-ink-2"><Figures>{entry.finding.remedy.words}</Figures></p> : null}
              </article>
            );
          })}
        </div>
      </div>
    </div>
  );
}
