import { deckNumber, modelLine } from '../deck/deck-number';
import type { NetlistPart } from '../netlist';
import { instanceParameters, nodesOf, numberOf } from './element-line';
import type { KindDeck } from './kind';

/** Stand-ins of an exchanged deck for what the sheet leaves out; the engine's own model says each as an assumption. */
const stand = { threshold: 3, ohms: 0.1, volts: 10, drainVolts: 100 };

function magnitude(part: NetlistPart, fact: keyof NetlistPart['facts']): number | undefined {
  const value = numberOf(part, fact);
  return value === undefined ? undefined : Math.abs(value);
}

function threshold(part: NetlistPart): number {
  const [min, typ, max] = [magnitude(part, 'vth_min'), magnitude(part, 'vth_typ'), magnitude(part, 'vth_max')];
  if (typ !== undefined) return typ;
  if (min !== undefined && max !== undefined) return (min + max) / 2;
  return min ?? max ?? stand.threshold;
}

/**
 * Inside of `.subckt Q1_MOS d g s`: a LEVEL=1 transistor with W/L = 1, body diode and the three capacitances as constants.
 * Level 1 in the triode region has R_DS = 1/(KP·(V_GS − VTO)) + RD + RS; half of R_DS(on) is given to the channel.
 */
function subcircuit(part: NetlistPart, name: string, type: 'nmos' | 'pmos'): string[] {
  const sign = type === 'nmos' ? 1 : -1;
  const vto = threshold(part);
  const ohms = numberOf(part, 'rds_on') ?? stand.ohms;
  const overdrive = Math.max((magnitude(part, 'rds_on_spec_vgs') ?? stand.volts) - vto, 0.1);
  const kp = rounded(1 / (0.5 * ohms * overdrive));
  const crss = numberOf(part, 'crss');
  const gateSource = difference(numberOf(part, 'ciss'), crss);
  const drainSource = difference(numberOf(part, 'coss'), crss);
  const diodeNodes = type === 'nmos' ? 's d' : 'd s';
  return [
    `.subckt ${name} d g s`,
    `M1 d g s s ${name}_CH W=1e-4 L=1e-4`,
    `D1 ${diodeNodes} ${name}_BD`,
    ...capacitor('CGS', 'g s', gateSource), ...capacitor('CGD', 'g d', crss), ...capacitor('CDS', 'd s', drainSource),
    modelLine(`${name}_CH`, type, { level: 1, vto: sign * vto, kp, rd: rounded(0.4 * ohms), rs: rounded(0.1 * ohms) }),
    modelLine(`${name}_BD`, 'd', { is: 1e-12, n: 1.1, bv: magnitude(part, 'vds_max') ?? stand.drainVolts, ibv: 2.5e-4 }),
    '.ends',
  ];
}

/** Six digits: far finer than any data sheet, short enough to read. */
function rounded(value: number): number {
  return Number(value.toPrecision(6));
}

function difference(whole: number | undefined, part: number | undefined): number | undefined {
  return whole === undefined ? undefined : rounded(Math.max(whole - (part ?? 0), 0));
}

function capacitor(name: string, nodes: string, farads: number | undefined): string[] {
  return farads === undefined || farads === 0 ? [] : [`${name} ${nodes} ${deckNumber(farads)}`];
}

/**
 * Deck half of a power MOSFET: `XQ1 d g s Q1_MOS` with its subcircuit. A part with a card of its own stays the `M`
 * element it came as; the bulk is tied to the source.
 */
export function mosfetDeck(type: 'nmos' | 'pmos'): KindDeck {
  return {
    letterOf: (part) => (part.model === undefined ? 'X' : 'M'),
    pinOrder: ['D', 'G', 'S', 'B'],
    read: (element, modelType) => element.letter === 'M' && modelType === type,
    write(part, name, node) {
      if (part.model !== undefined) {
        return [`${name} ${nodesOf(part, ['D', 'G', 'S', 'S'], node)} ${part.model}${instanceParameters(part)}`];
      }
      const inside = `${name.slice(1)}_MOS`;
      return [`${name} ${nodesOf(part, ['D', 'G', 'S'], node)} ${inside}`, ...subcircuit(part, inside, type)];
    },
  };
}
