import { snap, type Box, type Point } from '@/lib/document/geometry/point';
import { dragCorner, dragSegment } from '../edits/drag-line';
import { moveItems, shiftBy } from '../edits/move-items';
import { itemsInside, type Hit } from '../hit-test';
import type { PointerPress, Tool, ToolHost } from './tool';
import { WireTool } from './wire-tool';

/** Sheet units a press may wander before it is a drag. */
const slack = 3;

type Phase =
  | { readonly doing: 'nothing' }
  | { readonly doing: 'pressed'; readonly hit: Hit; readonly from: Point; readonly adds: boolean; readonly wasChosen: boolean }
  | { readonly doing: 'moving'; readonly from: Point }
  | { readonly doing: 'line'; readonly hit: Extract<Hit, { on: 'wire' | 'corner' }> }
  | { readonly doing: 'box'; readonly from: Point; readonly kept: ReadonlySet<string> }
  | { readonly doing: 'wiring' };

const idOf = (hit: Hit): string | null => {
  switch (hit.on) {
    case 'pin': case 'part': return hit.part;
    case 'wire': case 'corner': return hit.wire;
    case 'junction': return hit.junction;
    case 'nothing': return null;
  }
};

const boxBetween = (a: Point, b: Point): Box => ({ left: Math.min(a.x, b.x), top: Math.min(a.y, b.y), right: Math.max(a.x, b.x), bottom: Math.max(a.y, b.y) });

/** Chooses by click or box, moves what is chosen, shifts runs and corners of wires, and draws a wire out of a pin. */
export class SelectTool implements Tool {
  private phase: Phase = { doing: 'nothing' };
  private readonly wire: WireTool;

  constructor(private readonly host: ToolHost) {
    this.wire = new WireTool(host);
  }

  down(press: PointerPress): void {
    const hit = this.host.hit(press);
    const id = idOf(hit);
    const { selection } = this.host.state;
    const adds = press.shift === true || press.mod === true;
    const wasChosen = id !== null && selection.has(id);
    if (id !== null && !wasChosen) this.host.select(new Set(adds ? [...selection, id] : [id]));
    this.phase = { doing: 'pressed', hit, from: press.at, adds, wasChosen };
  }

  move(press: PointerPress): void {
    if (this.phase.doing === 'pressed') this.begin(press, this.phase);
    const { sheet, selection } = this.host.state;
    switch (this.phase.doing) {
      case 'moving':
        this.host.preview(moveItems(sheet, selection, shiftBy(snap(press.at.x - this.phase.from.x), snap(press.at.y - this.phase.from.y)), this.host.newId));
        break;
      case 'line': this.host.preview(this.shifted(press.at, this.phase.hit)); break;
      case 'box': this.host.gesture({ doing: 'box', box: boxBetween(this.phase.from, press.at) }); break;
      case 'wiring': this.wire.move(press); break;
      default:
    }
  }

  private begin(press: PointerPress, { hit, from, adds }: Extract<Phase, { doing: 'pressed' }>): void {
    if (Math.hypot(press.at.x - from.x, press.at.y - from.y) <= slack) return;
    const { readOnly, selection } = this.host.state;
    if (hit.on === 'nothing') {
      this.phase = { doing: 'box', from, kept: adds ? selection : new Set() };
    } else if (readOnly) {
      this.host.say('This sheet is read-only for you.');
      this.phase = { doing: 'nothing' };
    } else if (hit.on === 'pin') {
      this.phase = { doing: 'wiring' };
      this.wire.down({ ...press, at: hit.at });
    } else if ((hit.on === 'wire' || hit.on === 'corner') && selection.size === 1) {
      this.phase = { doing: 'line', hit };
      this.host.gesture({ doing: 'moving' });
    } else {
      this.phase = { doing: 'moving', from };
      this.host.gesture({ doing: 'moving' });
    }
  }

  private shifted(to: Point, hit: Extract<Hit, { on: 'wire' | 'corner' }>) {
    const { sheet } = this.host.state;
    const at = { x: snap(to.x), y: snap(to.y) };
    return hit.on === 'corner' ? dragCorner(sheet, hit.wire, hit.corner, at) : dragSegment(sheet, hit.wire, hit.segment, at);
  }

  up(press: PointerPress): void {
    const phase = this.phase;
    this.phase = { doing: 'nothing' };
    this.host.preview(null);
    switch (phase.doing) {
      case 'pressed': this.click(phase); break;
      case 'moving': {
        const [dx, dy] = [snap(press.at.x - phase.from.x), snap(press.at.y - phase.from.y)];
        this.host.gesture({ doing: 'nothing' });
        if (dx !== 0 || dy !== 0) this.host.run('move', { dx, dy });
        break;
      }
      case 'line': {
        const { wire } = phase.hit;
        this.host.gesture({ doing: 'nothing' });
        this.host.run('drag-line', phase.hit.on === 'corner' ? { wire, to: press.at, corner: phase.hit.corner } : { wire, to: press.at, segment: phase.hit.segment });
        break;
      }
      case 'box':
        this.host.gesture({ doing: 'nothing' });
        this.host.select(new Set([...phase.kept, ...itemsInside(this.host.state.sheet, boxBetween(phase.from, press.at))]));
        break;
      case 'wiring':
        this.wire.up(press);
        this.wire.finishHere();
        break;
      default:
    }
  }

  private click({ hit, adds, wasChosen }: Extract<Phase, { doing: 'pressed' }>): void {
    const id = idOf(hit);
    const { selection } = this.host.state;
    if (id === null) {
      if (!adds) this.host.select(new Set());
    } else if (adds && wasChosen) this.host.select(new Set([...selection].filter((other) => other !== id)));
    else if (!adds) this.host.select(new Set([id]));
  }

  double(): void {
    this.cancel();
  }

  cancel(): void {
    this.phase = { doing: 'nothing' };
    this.wire.cancel();
    this.host.preview(null);
    this.host.gesture({ doing: 'nothing' });
  }
}
