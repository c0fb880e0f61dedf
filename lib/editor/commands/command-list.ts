import { cancel } from './cancel';
import { copy } from './copy';
import { cut } from './cut';
import { deleteSelection } from './delete';
import { dragLine } from './drag-line';
import { drawWire } from './draw-wire';
import { dropScenario } from './drop-scenario';
import { duplicate } from './duplicate';
import { holdPart } from './hold-part';
import { join } from './join';
import { liftLead } from './lift-lead';
import { markOpen } from './mark-open';
import { mirror } from './mirror';
import { move } from './move';
import { nameNet } from './name-net';
import { nudgeDown } from './nudge-down';
import { nudgeLeft } from './nudge-left';
import { nudgeRight } from './nudge-right';
import { nudgeUp } from './nudge-up';
import { paste } from './paste';
import { placeNote } from './place-note';
import { placePart } from './place-part';
import { press } from './press';
import { putScenario } from './put-scenario';
import { redo } from './redo';
import { renamePart } from './rename-part';
import { selectAll } from './select-all';
import { selectItems } from './select-items';
import { setFacts } from './set-facts';
import { setPlan } from './set-plan';
import { splitWire } from './split-wire';
import { takeChange } from './take-change';
import { toggleKeys } from './toggle-keys';
import { toolAdd } from './tool-add';
import { toolLift } from './tool-lift';
import { toolNetName } from './tool-net-name';
import { toolNote } from './tool-note';
import { toolSelect } from './tool-select';
import { toolWire } from './tool-wire';
import { turnLeft } from './turn-left';
import { turnRight } from './turn-right';
import { undo } from './undo';
import { zoomFit } from './zoom-fit';
import { zoomIn } from './zoom-in';
import { zoomOut } from './zoom-out';

/** Every command of the sheet, by name, in the order of the command list. */
export const commands = {
  'tool-select': toolSelect,
  'tool-wire': toolWire,
  'tool-net-name': toolNetName,
  'tool-note': toolNote,
  'tool-lift': toolLift,
  'tool-add': toolAdd,
  'hold-part': holdPart,
  'place-part': placePart,
  move: move,
  'nudge-left': nudgeLeft,
  'nudge-right': nudgeRight,
  'nudge-up': nudgeUp,
  'nudge-down': nudgeDown,
  'turn-left': turnLeft,
  'turn-right': turnRight,
  mirror: mirror,
  'set-facts': setFacts,
  'rename-part': renamePart,
  'draw-wire': drawWire,
  'drag-line': dragLine,
  'split-wire': splitWire,
  join: join,
  'name-net': nameNet,
  'place-note': placeNote,
  'mark-open': markOpen,
  'lift-lead': liftLead,
  delete: deleteSelection,
  cut: cut,
  copy: copy,
  paste: paste,
  duplicate: duplicate,
  'select-all': selectAll,
  'select-items': selectItems,
  undo: undo,
  redo: redo,
  'take-change': takeChange,
  press: press,
  cancel: cancel,
  'zoom-in': zoomIn,
  'zoom-out': zoomOut,
  'zoom-fit': zoomFit,
  'toggle-keys': toggleKeys,
  'set-plan': setPlan,
  'put-scenario': putScenario,
  'drop-scenario': dropScenario,
} as const;

export type CommandName = keyof typeof commands;

/** Arguments of a command; `void` for those that need none. */
export type ArgsOf<Name extends CommandName> = Parameters<(typeof commands)[Name]['perform']>[1];
