import { expect, test } from 'vitest';
import { netlistFromDeck } from '../deck/netlist-from-deck';
import { readDeck } from '../deck/read-deck';
import { buildCircuit, type Circuit } from './circuit';

function circuit(lines: string): Circuit {
  const reading = readDeck(`t\n${lines}\n.end\n`);
  if (!reading.ok) throw new Error(JSON.stringify(reading.errors));
  return buildCircuit(netlistFromDeck(reading.document).netlist);
}

const controls = ({ sources }: Circuit) => sources.controls.map(({ part, high, low }) => [part.ref, high, low]);
const stage = 'M1 d g 0 0 N\n*@M1 kind=NMOS\nRL vdd d 10\nRG in g 10\nRGS g 0 10k';

test('role pin and generator are controls, with the levels of their facts', () => {
  expect(controls(circuit(`VDD vdd 0 12\n*@VDD role=supply\nVG in 0 0\n*@VG role=pin high=3.3\n${stage}`))).toEqual([['VG', 3.3, 0]]);
  expect(controls(circuit(`VDD vdd 0 12\nVG in 0 0\n*@VG role=generator high=11 low=-2\n${stage}`))).toEqual([['VG', 11, -2]]);
});

test('without a mark: the source that reaches a gate through series parts, never the power source', () => {
  const bare = circuit(`VDD vdd 0 12\nVG in 0 PULSE(0 10 0 1n 1n 1u 2u)\n${stage}`);
  expect(controls(bare)).toEqual([['VG', 10, 0]]);
  expect(bare.sources.power?.ref).toBe('VDD');
});

test('levels of a wave: pulse, sine, piecewise; else the DC value and 0', () => {
  const levels = (wave: string) => controls(circuit(`VDD vdd 0 12\n*@VDD role=supply\nVG in 0 ${wave}\n${stage}`))[0]?.slice(1);
  expect(levels('SIN(2 3 1k)')).toEqual([5, -1]);
  expect(levels('PWL(0 0 1u 8 2u 1)')).toEqual([8, 0]);
  expect(levels('9')).toEqual([9, 0]);
});

test('a pull-up from the supply makes no control of it', () => {
  const pulled = circuit('V1 vdd 0 12\nV2 in 0 5\nRP vdd g 10k\nM2 g in 0 0 N\n*@M2 kind=NMOS\nM1 d g 0 0 N\n*@M1 kind=NMOS\nRL vdd d 10');
  expect(controls(pulled)).toEqual([['V2', 5, 0]]);
  expect(pulled.sources.power?.ref).toBe('V1');
});

test('several supplies leave the power source open', () => {
  expect(circuit('V1 a 0 12\n*@V1 role=supply\nV2 b 0 24\n*@V2 role=supply\nR1 a b 1k').sources.power).toBeNull();
});

test('parts of one stage: way, pull-down, load, clamp', () => {
  const [one] = circuit(`VDD vdd 0 12\nVG in 0 10\n${stage}\nDZ 0 g DZ\n*@DZ kind=zener vz=12`).stages;
  expect(one?.way.map(({ part }) => part.ref)).toEqual(['RG']);
  expect(one?.pullDowns.map(({ part, ohms }) => [part.ref, ohms])).toEqual([['RGS', 10_000]]);
  expect(one?.clamps.map(({ ref }) => ref)).toEqual(['DZ']);
  expect(one?.load.map(({ part }) => part.ref)).toEqual(['RL']);
});

test('a fast wave is a switching frequency, a slow one is not', () => {
  const fsw = (wave: string) => circuit(`VDD vdd 0 12\n*@VDD role=supply\nVG in 0 ${wave}\n${stage}`).sources.controls[0]?.fsw;
  expect(fsw('PULSE(0 10 0 10n 10n 20u 40u)')).toBeCloseTo(25_000, 6);
  expect(fsw('PULSE(0 10 0 1u 1u 1 2)')).toBeUndefined();
  expect(fsw('10')).toBeUndefined();
});
