import { pathBetween, type WireBends } from '@/lib/document/geometry/wire-path';
import { pinPlaceOf } from '@/lib/document/geometry/pin-place';
import { samePoint, snapPoint, type Point } from '@/lib/document/geometry/point';
import { indexOf } from '@/lib/document/geometry/sheet-index';
import { sheetToNetlist } from '@/lib/document/nets/sheet-to-netlist';
import type { Hit } from '../hit-test';
import { netAt } from '../spoken/net-at';
import type { PointerPress, Tool, ToolHost } from './tool';

/** Sheet units a press may wander and still be a click, not a drag. */
const slack = 6;

interface Laying {
  readonly from: Point;
  readonly out: Point | undefined;
  readonly name: string;
  readonly bends: readonly Point[];
  readonly pressed: Point;
}

/**
 * Draws wires: press and drag from end to end, or click from bend to bend. A click on a pin, junction or wire ends the
 * wire there, a second click at once or Escape ends it loose.
 */
export class WireTool implements Tool {
  private laying: Laying | null = null;

  constructor(private readonly host: ToolHost) {}

  down(press: PointerPress): void {
    if (this.host.state.readOnly) {
      this.host.say('This sheet is read-only for you.');
      return;
    }
    const hit = this.host.hit(press);
    const at = this.placeOf(hit, press);
    if (this.laying) {
      if (hit.on !== 'nothing' && hit.on !== 'part') this.finish(at);
      else this.laying = { ...this.laying, bends: [...this.laying.bends, at], pressed: press.at };
      if (this.laying) this.show(press);
      return;
    }
    const { sheet } = this.host.state;
    const part = hit.on === 'pin' ? indexOf(sheet).part.get(hit.part) : undefined;
    const out = part && hit.on === 'pin' ? pinPlaceOf(part, hit.pin)?.out : undefined;
    const name = part && hit.on === 'pin' ? `${part.ref || 'mark'}:${hit.pin}` : netAt(sheet, sheetToNetlist(sheet), hit) ?? 'here';
    this.laying = { from: at, out, name, bends: [], pressed: press.at };
    this.show(press);
  }

  move(press: PointerPress): void {
    if (this.laying) this.show(press);
  }

  /** A drag ends the wire where it is let go; after a click the wire goes on. */
  up(press: PointerPress): void {
    if (!this.laying || this.laying.bends.length > 0) return;
    if (Math.hypot(press.at.x - this.laying.pressed.x, press.at.y - this.laying.pressed.y) > slack) this.finish(this.placeOf(this.host.hit(press), press));
  }

  double(): void {
    const last = this.laying?.bends.at(-1);
    if (this.laying && last) {
      this.laying = { ...this.laying, bends: this.laying.bends.filter((bend) => !samePoint(bend, last)) };
      this.finish(last);
    }
  }

  /** Keeps what has been laid up to the last bend; a wire without one is dropped. */
  cancel(): void {
    if (this.laying && this.laying.bends.length > 0) this.double();
    this.laying = null;
    this.host.gesture({ doing: 'nothing' });
  }

  /** Drops a wire that was not ended by the drag that began it. */
  finishHere(): void {
    if (this.laying) this.laying = null;
    this.host.gesture({ doing: 'nothing' });
  }

  private placeOf(hit: Hit, press: PointerPress): Point {
    return snapPoint(hit.on === 'nothing' || hit.on === 'part' ? press.at : hit.at);
  }

  private finish(to: Point): void {
    if (!this.laying) return;
    const { from, bends } = this.laying;
    this.laying = null;
    this.host.gesture({ doing: 'nothing' });
    this.host.run('draw-wire', { from, to, bends });
  }

  private show(press: PointerPress): void {
    if (!this.laying) return;
    const { from, out, bends, name } = this.laying;
    const { sheet } = this.host.state;
    const hit = this.host.hit(press);
    const at = this.placeOf(hit, press);
    const part = hit.on === 'pin' ? indexOf(sheet).part.get(hit.part) : undefined;
    const into = part && hit.on === 'pin' ? pinPlaceOf(part, hit.pin)?.out : undefined;
    const corners: WireBends = bends.map(({ x, y }) => [x, y]);
    const path = pathBetween({ ...from, ...(out ? { out } : {}) }, corners, { ...at, ...(into ? { out: into } : {}) });
    this.host.gesture({ doing: 'wiring', path, from: name, at, joins: samePoint(at, from) ? null : netAt(sheet, sheetToNetlist(sheet), hit) });
  }
}
