import type { Netlist } from '../../netlist';
import type { RuleCase } from '../testing/rule-case';

const three = 'V1 vcc 0 12\n*@V1 role=supply\nR1 vcc mid 10k\n*@R1 pmax=0.25\nR2 mid 0 10k\n*@R2 pmax=0.25';
const plug = 'V1 vcc 0 12\n*@V1 role=supply\nRJ1A vcc a 1m\n*@RJ1A kind=plug-contact part_of=J1\nRJ1B a 0 1m\n*@RJ1B kind=plug-contact part_of=J1';

const rename = (from: string, to: string) => (netlist: Netlist): Netlist =>
  ({ ...netlist, parts: netlist.parts.map((part) => (part.ref === from ? { ...part, ref: to } : part)) });

/** `docs/rules.md` 56; common practice, no source. */
export const cases: readonly RuleCase[] = [
  { name: 'two resistors of one name', deck: three, edit: rename('R2', 'R1'), expect: { outcome: 'fail', severity: 'caution', refs: ['R1'], says: '2 parts are called R1' } },
  { name: 'case does not tell them apart', deck: three, edit: rename('R2', 'r1'), expect: { outcome: 'fail', refs: ['R1'] } },
  { name: 'a resistor called like the source', deck: three, edit: rename('R2', 'V1'), expect: { outcome: 'fail', refs: ['V1'] } },
  { name: 'no designator', deck: three, edit: rename('R2', ''), expect: { outcome: 'fail', says: 'has no designator' } },
  { name: 'each its own', deck: three, expect: { outcome: 'pass' } },
  { name: 'contacts of one plug', deck: plug, expect: { outcome: 'pass', says: /one plug|one part/ } },
  { name: 'numbers tell them apart', deck: three, edit: rename('R2', 'R11'), expect: { outcome: 'pass' } },
  { name: 'the inside of a part', deck: 'R1 0 0 1\n*@R1 internal=winding', expect: { outcome: 'none' } },
];
