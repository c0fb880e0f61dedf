import { snapPoint } from '@/lib/document/geometry/point';
import type { PointerPress, Tool, ToolHost } from './tool';

/** Tools that act on one press, once the pointer is up. */
abstract class PressTool implements Tool {
  constructor(protected readonly host: ToolHost) {}

  protected abstract press(press: PointerPress): void;

  down(): void {}

  move(_press: PointerPress): void {}

  up(press: PointerPress): void {
    this.press(press);
  }

  double(): void {}

  cancel(): void {
    this.host.gesture({ doing: 'nothing' });
  }
}

/** Asks for a net's name where it was pressed; the words go to the command `name-net`. */
export class NetNameTool extends PressTool {
  protected press(press: PointerPress): void {
    if (this.host.state.readOnly) return this.host.say('This sheet is read-only for you.');
    const hit = this.host.hit(press);
    this.host.gesture({ doing: 'asking', what: 'net-name', at: snapPoint(hit.on === 'part' || hit.on === 'nothing' ? press.at : hit.at) });
  }
}

/** Asks for a note's words where it was pressed; they go to the command `place-note`. */
export class NoteTool extends PressTool {
  protected press(press: PointerPress): void {
    if (this.host.state.readOnly) return this.host.say('This sheet is read-only for you.');
    this.host.gesture({ doing: 'asking', what: 'note', at: snapPoint(press.at) });
  }
}

/** Shows the pressed lead or plug lifted, or plugged in again. */
export class LiftTool extends PressTool {
  protected press(press: PointerPress): void {
    const hit = this.host.hit(press);
    const part = hit.on === 'part' || hit.on === 'pin' ? this.host.state.sheet.parts.find((one) => one.id === hit.part) : undefined;
    if (part) this.host.run('lift-lead', { ref: part.ref });
    else this.host.say('Press a removable lead or a plug to see it lifted.');
  }
}

/** Puts the part in hand down; with Shift another one of it stays in hand. */
export class AddTool extends PressTool {
  override move(press: PointerPress): void {
    const { ghost } = this.host.state;
    if (ghost) this.host.hold({ ...ghost, at: snapPoint(press.at) });
  }

  protected press(press: PointerPress): void {
    const { ghost } = this.host.state;
    if (!ghost) return this.host.say('Choose a part in the drawer first.');
    const { kind, turn, mirror } = ghost;
    if (press.shift !== true) this.host.hold(null);
    if (kind === 'net-name' || kind === 'note') this.host.gesture({ doing: 'asking', what: kind, at: snapPoint(press.at) });
    else this.host.run('place-part', { kind, at: press.at, turn, mirror });
  }
}
