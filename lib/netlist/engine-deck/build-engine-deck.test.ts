import { describe, expect, it } from 'vitest';
import type { Netlist, NetlistPart } from '../netlist';
import { bareNetlist, barePart, bareTwoPin } from '../testing/bare-netlist';
import { buildEngineDeck, type DeckOptions, type EngineDeck } from './build-engine-deck';
import type { PartSettings } from './effective-part';

const supply = barePart('dc-supply', 'V1', { '+': 'BUS', '-': '0' }, { value: 15, ilim: 1 });
const load = bareTwoPin('resistor', 'R1', 'BUS', 'D', { value: 10 });
const fet = barePart('nmos', 'Q1', { G: 'G', D: 'D', S: '0' }, { vth_min: 2, vth_max: 4, rds_on: 0.05, rds_on_spec_vgs: 10, id_max: 20 });
const pullDown = bareTwoPin('resistor', 'R2', 'G', '0', { value: 22e3 });
const lead = bareTwoPin('removable-lead', 'W1', 'CTL', 'G');
const generator = barePart('signal-generator', 'G1', { '+': 'CTL', '-': '0' }, { high: 10, low: 0, rs: 50 });
const stage: readonly NetlistPart[] = [supply, load, fet, pullDown, lead, generator];

function build(parts: readonly NetlistPart[], options: Partial<DeckOptions> = {}, rest: Partial<Netlist> = {}) {
  return buildEngineDeck(bareNetlist(parts, rest), { settings: {}, corner: 'typ', ...options });
}
function deckOf(parts: readonly NetlistPart[], options: Partial<DeckOptions> = {}, rest: Partial<Netlist> = {}): EngineDeck {
  const deck = build(parts, options, rest);
  if ('code' in deck) throw new Error(deck.words);
  return deck;
}
const lines = (settings: PartSettings): string => deckOf(stage, { settings }).request.lines.join('\n');

describe('the deck', () => {
  it('holds generated names and numbers only, whatever people wrote', () => {
    const nasty = 'quit\n.control';
    const deck = deckOf([
      barePart('dc-source', nasty, { '+': `${nasty} {x}`, '-': '0' }, { value: 5 }),
      { ...bareTwoPin('resistor', "R'1", `${nasty} {x}`, '0', { value: 1e3, note: nasty, part: nasty }), id: nasty },
    ]);
    expect(deck.request.lines).toEqual([
      '.options temp=2.500000000e+1 tnom=25 reltol=0.0001',
      'Vp1 n1 0 5.000000000e+0',
      'Rp2 n1 0 1.000000000e+3',
      '.save v(n1) i(vp1) @rp2[i]',
      '.op',
    ]);
  });

  it('gives the same lines for the same netlist', () => {
    expect(lines({})).toBe(lines({}));
  });

  it('sets a source to what the run says, below its limit or without one', () => {
    expect(lines({ V1: { volts: 325, amps: 0.2 } })).toMatch(/I = min\(2\.0+e-1, \(3\.25/);
    expect(lines({ V1: { amps: null } })).not.toContain('min(');
    expect(lines({ G1: { volts: 10 } })).toMatch(/Vp6 n\d 0 1\.0+e\+1/);
  });

  it('leaves out what is lifted', () => {
    const deck = deckOf(stage, { settings: { W1: { removed: true } } });
    expect(deck.request.lines.filter((line) => line.startsWith('R'))).toHaveLength(4);
  });

  it('tells what its models assumed', () => {
    expect(deckOf(stage).assumed).toContainEqual({ part: 'Q1', fact: 'vth_typ', words: 'not given: mean of minimum and maximum' });
  });

  it('adds gate leakage when it is asked to, 1 µA where nobody gave one', () => {
    expect(deckOf(stage, { gateLeakage: -1 }).request.lines.join('\n')).toMatch(/Ip3g 0 n\d -1\.0+e-6/);
  });

  it('runs at the scenario\'s ambient, at 27 °C where a part brought its own card', () => {
    const card = { name: 'DX', type: 'd', params: { is: 1e-12 }, flags: [] };
    const own = [supply, { ...barePart('diode', 'D1', { A: 'BUS', K: '0' }), model: 'dx' }];
    expect(deckOf(stage, { ambient: 60 }).request.lines[0]).toContain('temp=6.0');
    expect(deckOf(own, {}, { models: [card] }).request.lines[0]).toContain('temp=2.7');
    expect(deckOf(own, {}, { models: [card] }).request.lines.join('\n')).toContain('tnom=2.700000000e+1 is=1.0');
  });
});

describe('an own card', () => {
  const mos = { ...fet, facts: { vth_min: 2, vth_typ: 3, vth_max: 4 }, model: 'MX', params: { w: 1e-2, l: 1e-6 } };
  const card = { name: 'MX', type: 'nmos', params: { level: 1, vto: 2.9, kp: 2e-5 }, flags: [] };
  const model = (corner: DeckOptions['corner']): string =>
    deckOf([supply, load, mos, pullDown], { corner }, { models: [card] }).request.lines.find((line) => line.startsWith('.model')) ?? '';

  it('is kept, its threshold alone moving with the corner', () => {
    expect(model('typ')).toContain('vto=2.900000000e+0 kp=2.0');
    expect(model('min')).toContain('vto=1.900000000e+0 kp=2.0');
    expect(model('max')).toContain('vto=3.900000000e+0 kp=2.0');
  });

  it('keeps the bulk on the source and the instance\'s size', () => {
    const { lines } = deckOf([supply, load, mos, pullDown], {}, { models: [card] }).request;
    expect(lines.find((line) => line.startsWith('M'))).toMatch(/^Mp3 n\d n\d 0 0 mp3 w=1\.0+e-2 l=1\.0+e-6$/);
  });
});

describe('what has no DC path', () => {
  it('is left out with the parts on it, and has no volts and no amps', () => {
    const deck = deckOf([...stage, bareTwoPin('resistor', 'R9', 'X', 'Y', { value: 1 }), bareTwoPin('capacitor', 'C1', 'BUS', 'X', { value: 1e-6 })]);
    const point = deck.decode(Object.fromEntries(deck.request.vectors.map((vector) => [vector, 1])));
    expect(Object.keys(point.volts).sort()).toEqual(['0', 'BUS', 'CTL', 'D', 'G']);
    expect(point.amps['R9:1']).toBeUndefined();
    expect(point.amps['C1:1']).toBe(0);
  });

  it('leaves no run when it is a gate', () => {
    expect(build([supply, load, fet, lead])).toMatchObject({ code: 'precheck', nodes: ['G'], parts: ['Q1'] });
  });

  it('leaves no run when a current is driven into it', () => {
    const driven = [supply, load, fet, pullDown, barePart('box', 'I1', { 1: '0', 2: 'Q' }, { element: 'I', value: 1e-3 })];
    expect(build(driven)).toMatchObject({ code: 'precheck', nodes: ['Q'], parts: ['I1'] });
  });
});

describe('a refusal', () => {
  it('names the part and the fact that is missing', () => {
    expect(build([...stage, bareTwoPin('resistor', 'R3', 'BUS', '0')])).toMatchObject({ code: 'missing-fact', words: 'R3 has no value' });
    expect(build([supply, load, { ...fet, facts: { vth_typ: 3 } }, pullDown])).toMatchObject({ words: 'Q1 has no rds_on' });
    expect(build([supply, barePart('box', 'E1', { 1: 'BUS', 2: '0' }, { element: 'E' })])).toMatchObject({ words: 'E1 stands as a box: it is not simulated' });
  });

  it('names a ring of sources', () => {
    const bare = barePart('dc-source', 'V2', { '+': 'BUS', '-': '0' }, { value: 12 });
    expect(build([bare, bareTwoPin('inductor', 'L1', 'BUS', '0', { value: 1e-3 })])).toMatchObject({ code: 'precheck', parts: ['V2', 'L1'] });
  });
});

describe('the answer', () => {
  it('is read back by net and pin, with the supply\'s limit told', () => {
    const deck = deckOf(stage, { settings: { V1: { amps: 0.5 } } });
    const point = deck.decode(Object.fromEntries(deck.request.vectors.map((vector) => [vector, vector.startsWith('i(vp1') ? -0.5 : 0.25])));
    expect(point.volts).toEqual({ 0: 0, BUS: 0.25, CTL: 0.25, D: 0.25, G: 0.25 });
    expect(point.amps).toMatchObject({ 'V1:+': -0.5, 'V1:-': 0.5, 'R1:1': 0.25, 'R1:2': -0.25, 'Q1:D': 0.25, 'Q1:S': -0.25, 'Q1:G': 0 });
    expect(point.limited).toEqual(['V1']);
  });
});
