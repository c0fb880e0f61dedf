import { expect, test } from 'vitest';
import { contentHash } from '../hash';
import { SeededRandom } from '../testing/seeded-random';
import { netlistFromDeck } from './netlist-from-deck';
import { readDeck } from './read-deck';
import { writeDeck } from './write-deck';

const names = ['R1', 'r2', 'C1', 'L1', 'D1', 'M1', 'Q1', 'V1', 'V2', 'I1', 'X1', 'E1', 'K1', 'Z9', 'gate', 'RW1', '__proto__', 'constructor'];
const nodes = ['0', 'gnd', 'GND', 'a', 'A', 'n1', 'gate', 'R1', '12', 'bus+', 'x:y', 'a,b', '__proto__'];
const tails = ['1k', '4k7', '1M', 'MN', 'MP', 'DD', 'QN', 'S1', 'DC 5', 'SIN(0 1 50)', 'PULSE(0,5)', 'PWL(0 0 1 1)', 'AC 1', 'W=1u', 'IC=2', '{p}', 'off', ''];
const facts = ['kind=NMOS', 'kind=lead', 'kind=LED', 'kind=switch', 'kind=fuse', 'kind=odd', 'kind=plug-contact', 'ref=Q7', 'ref="a b"', 'pins=D:a,G:gate,S:0', 'plus=a',
  'cathode=a', 'role=mains', 'rms=230', 'f=50', 'ilim=1', 'pmax=0.25', 'value=2', 'value=missing', 'value=x', 'polarised=yes', 'name=bus', 'part_of=J1', 'contact=1',
  'wire=yes', 'foo=1', 'foo=yes', 'earth=yes', 'vz=5', 'high=11', 'fsw=25k', 'note=x = "y"; z', 'range=1..2', '"', '=', 'text=a', '__proto__=1', 'constructor=x', 'kind=constructor', 'kind=__proto__'];
const fixed = ['.model C1 constructor(__proto__=1)', '.options __proto__=1', '.param constructor=1', '.model MN NMOS(VTO=2)', '.model MP VDMOS(pchan VTO=-2)', '.model DD D', '.model QN NPN BF=100', '.param p=2', '.op', '.temp 40', '+ 5', '* note',
  '.subckt S1 a b', '.ends', '.end', '.include x', '.options temp=30', 'R9 a b 1 ; c', '(((', '{', '.', '*@', '\u0000'];

function line(random: SeededRandom): string {
  const kind = random.next();
  if (kind < 0.15) return random.pick(fixed);
  if (kind < 0.4) return `*@${random.pick([...names, ...nodes])} ${Array.from({ length: random.below(5) }, () => random.pick(facts)).join(' ')}`;
  const ends = Array.from({ length: 1 + random.below(4) }, () => random.pick(nodes));
  return [random.pick(names), ...ends, random.pick(tails), random.chance(0.2) ? random.pick(tails) : ''].join(' ');
}

/** Library of most decks, so that many are read. */
const library = ['.model MN NMOS(VTO=2)', '.model DD D', '.model QN NPN BF=100', '.subckt S1 a b', 'R1 a b 1', '.ends'];

test('any deck is answered, and one that is read is the same circuit when written and read again', () => {
  let read = 0;
  for (let seed = 0; seed < 1_500; seed++) {
    const random = new SeededRandom(seed);
    const lines = Array.from({ length: 1 + random.below(6) }, () => line(random));
    const reading = readDeck(['title', ...(random.chance(0.8) ? library : []), ...lines].join('\n'));
    if (!reading.ok) {
      expect(reading.errors[0]).toMatchObject({ line: expect.any(Number), reason: expect.stringMatching(/\.$/) });
      continue;
    }
    read += 1;
    const { netlist } = netlistFromDeck(reading.document);
    const again = readDeck(writeDeck(netlist));
    if (!again.ok) throw new Error(`Seed ${seed}: ${JSON.stringify(again.errors)}\n${lines.join('\n')}\n---\n${writeDeck(netlist)}`);
    expect(contentHash(netlistFromDeck(again.document).netlist), `seed ${seed}\n${lines.join('\n')}`).toBe(contentHash(netlist));
  }
  expect(read).toBeGreaterThan(250);
});
