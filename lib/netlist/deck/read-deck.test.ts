import { describe, expect, test } from 'vitest';
import { readDeck } from './read-deck';

function errors(...lines: string[]): string[] {
  const reading = readDeck(['title', ...lines].join('\n'));
  return reading.ok ? [] : reading.errors.map(({ line, reason }) => `${line}: ${reason}`);
}

function document(...lines: string[]) {
  const reading = readDeck(['title', ...lines].join('\n'));
  if (!reading.ok) throw new Error(JSON.stringify(reading.errors));
  return reading.document;
}

describe('lines', () => {
  test('line 1 is the title whatever it says', () => {
    expect(readDeck('R1 a b 1k')).toMatchObject({ ok: true, document: { title: 'R1 a b 1k', elements: [] } });
    expect(readDeck('')).toMatchObject({ ok: true, document: { title: '', elements: [] } });
  });

  test('comments, continuations, either case, any line end', () => {
    const reading = readDeck('\ufefft\r\n* all comment\r\nr1 A 0 ; half\r\n+ 4.7K $ the rest\r\n\r\n   * indented\rC1 a$b 0 1U');
    expect(reading).toMatchObject({ ok: true, document: { elements: [
      { letter: 'R', name: 'r1', nodes: ['A', '0'], value: 4_700, line: 3 }, { letter: 'C', name: 'C1', nodes: ['a$b', '0'], value: 1e-6, line: 7 },
    ] } });
  });

  test('nothing is read after .end', () => {
    expect(document('R1 a 0 1', '.END', 'this is no deck').elements).toHaveLength(1);
  });

  test('a continuation of nothing', () => {
    expect(errors('+ 4')).toEqual(['2: A line that starts with + continues the one before, and there is none.']);
  });

  test('a control character', () => {
    expect(errors('R1 a b 1', 'R2 a\u0000 b 1')).toEqual(['3: The line has a control character in it.']);
  });
});

describe('refusals carry line and reason', () => {
  test.each<[string, string]>([
    ['R1 a', 'R1 has too few nodes: it takes 2.'],
    ['R1 a 10k', 'R1 has too few nodes: it takes two and a value.'],
    ['R1 a b 4k7', '4k7 is not a number in a deck; write 4.7k.'],
    ['R1 a b 4k7x9', '4k7x9 is not a number.'],
    ['R1 a b 1,5k', '1,5k has a comma; a deck takes a point: 1.5k.'],
    ['R1 a b 1k 5', 'R1: 5 is not understood after its value.'],
    ['C1 a b 1n CM', 'C1: CM is not understood after its value.'],
    ['V1 a', 'V1 has too few nodes: it takes 2.'],
    ['V1 a 0 DC', 'V1 has no number after DC.'],
    ['V1 a 0 5 6', 'V1: 6 is not understood after its value.'],
    ['V1 a 0 SFFM(0 1 2)', 'SFFM is not a number.'],
    ['V1 a 0 SIN(1)', 'V1: SIN takes 2 to 6 numbers and has 1.'],
    ['V1 a 0 PWL(0 0 0 5)', 'V1: the times of PWL must rise.'],
    ['V1 a 0 PWL(0 0 1)', 'V1: PWL takes pairs of time and value.'],
    ['V1 a 0 SIN(0 1', 'The parentheses do not pair.'],
    ['V1 a 0 SIN 0 1) 2', 'The parentheses do not pair.'],
    ['D1 a k DD 2 3', 'D1: 3 is not understood after its model DD.'],
    ['Q1 c b e QQ big', 'Q1: big is not understood after its model QQ.'],
    ['Q1 c b NPN', 'Q1 has too few nodes or no model: it takes 3 nodes and a model.'],
    ['M1 d g s MM', 'M1 has too few nodes or no model: it takes 4 nodes and a model.'],
    ['D1 a k', 'D1 has too few nodes or no model: it takes 2 nodes and a model.'],
    ['X1 a b NOWHERE', 'X1 names the subcircuit NOWHERE, which the deck does not have.'],
    ['X1 FET', 'X1 takes its nodes and the name of a subcircuit.'],
    ['E1 a 0 b', 'E1 has too few nodes: it takes 4.'],
    ['.include parts.lib', 'Other files are not read; paste the models that the deck needs into it.'],
    ['.lib parts.lib', 'Libraries are not read; paste the models that the deck needs into it.'],
    ['.control', 'Commands are not run; leave the .control block out.'],
    ['.func f(x)={x}', '.func is not read.'],
    ['.subckt S a', '.subckt S has no .ends.'],
    ['.ends', '.ends has no .subckt.'],
    ['.model X', 'A .model line takes a name and a type.'],
    ['R1 a b {x}', '{x} names no .param of this deck.'],
    ['R1 a b {2*x}', '{2*x} is an expression; only {name} of a .param is read. Put the number in its place.'],
    ['R1 a b {x', 'A { has no }.'],
    ['.param a={a}', '{a} names no .param of this deck.'],
    ['.param a', 'A .param line takes name=number; expressions are not read.'],
    ['.param a=2*3', '2*3 is not a number.'],
    [`R${'1'.repeat(60)} a b 1`, 'The element has a name longer than 40 characters.'],
    ['4 apples', '4 apples is neither an element nor a statement of a deck.'],
  ])('%s', (line, reason) => {
    expect(errors(line)).toContain(`2: ${reason}`);
  });

  test('all of them at once, in order of lines', () => {
    expect(errors('R1 a b 4k7', '.include x', 'R2 a').map((error) => error.slice(0, 2))).toEqual(['2:', '3:', '4:']);
  });

  test('the lines of a .control block are not told one by one', () => {
    expect(errors('.control', 'foreach x 1 2', 'quit', '.endc', 'R1 a b 1')).toHaveLength(1);
  });
});

describe('limits', () => {
  test('size, lines, length of a line', () => {
    expect(errors('*'.repeat(4_000).concat('\n').repeat(70))).toEqual(['1: The deck is larger than 256 KiB.']);
    expect(errors('\n'.repeat(5_001))).toEqual(['5001: The deck has more than 5000 lines.']);
    expect(errors(`R1 a b ${' '.repeat(5_000)}1`)[0]).toContain('longer than 4096');
    expect(errors('R1 a b 1', ...Array.from({ length: 50 }, () => `+ ${'x'.repeat(100)}`))[0]).toBe('2: The line with its continuations is longer than 4096 characters.');
  });

  const bomb = Array.from({ length: 6 }, (_, level) => [`.subckt S${level} a`, ...Array(10).fill(0).map((_, n) => (level === 0 ? `R${n} a 0 1` : `X${n} a S${level - 1}`)), '.ends']).flat();
  test('a thousand parts once expanded', () => {
    expect(errors(...bomb, 'X1 a S5')[0]).toBe('1: The deck has 1000000 parts with its subcircuits expanded; at most 1000 are checked.');
    expect(errors(...bomb, 'X1 a S2')).toEqual([]);
  });

  test('a subcircuit that calls itself, by way of another', () => {
    expect(errors('.subckt A a', 'X1 a B', '.ends', '.subckt B a', 'X1 a A', '.ends', 'X1 n A')[0]).toContain('calls itself');
  });

  test('calls deeper than eight', () => {
    const chain = (depth: number) => Array.from({ length: depth }, (_, n) => [`.subckt S${n} a`, n === 0 ? 'R1 a 0 1' : `X1 a S${n - 1}`, '.ends']).flat();
    expect(errors(...chain(8), 'X1 n S7')).toEqual([]);
    expect(errors(...chain(9), 'X1 n S8')[0]).toContain('more than 8 deep');
  });

  test('hostile texts answer in a time that grows with their length only', () => {
    const started = performance.now();
    for (const piece of ['((((', '{{{{', '====', ' ', 'R1 a b ', '*@a b=', '1e', ',.,.']) errors(piece.repeat(Math.floor(4_000 / piece.length)), `*@R1 ${piece.repeat(900)}`);
    expect(performance.now() - started).toBeLessThan(2_000);
  });
});

describe('statements', () => {
  test('sources take value, DC, AC and wave in any order, commas in parentheses', () => {
    const { elements } = document('V1 a 0 AC 1 0 PULSE(0, 5 0 1n 1n 1u 2u) DC 3', 'V2 a 0 5', 'V3 a 0 SIN 0 325 50', 'I1 a 0 PWL(0 0,1m 5)', 'V4 a 0 AC');
    expect(elements.map(({ value, wave }) => [value, wave?.shape, wave?.args.length])).toEqual([
      [3, 'pulse', 7], [5, undefined, undefined], [undefined, 'sin', 3], [undefined, 'pwl', 4], [undefined, undefined, undefined],
    ]);
  });

  test('an = is as good as a space; a bare number after a model is its area', () => {
    const { elements } = document('V1 a 0 DC = 5', 'R1 a b R=1k TC1=1m', 'D1 a k DD 2 OFF', 'R2 a b {x}', '.param x=1M');
    expect(elements.map(({ value, params }) => [value, params])).toEqual([[5, {}], [1_000, { tc1: 1e-3 }], [undefined, { area: 2 }], [1e-3, {}]]);
  });

  test('a resistor has a model before or after its value', () => {
    const { elements } = document('R1 a b RM 1k', 'R2 a b 1k RM', 'R3 a b RM L=10u', '.model RM R(TC1=1m)');
    expect(elements.map(({ value, model }) => [value, model])).toEqual([[1_000, 'RM'], [1_000, 'RM'], [undefined, 'RM']]);
  });

  test('.param is a number that {name} stands for, wherever it is written', () => {
    expect(document('R1 a b {Rg}', '.param rg = 47 half={RG}', 'R2 a b {half}').elements.map(({ value }) => value)).toEqual([47, 47]);
  });

  test('models stand below or above, across lines, with or without parentheses', () => {
    const { models, elements } = document('Q1 c b e s QN', 'M1 d g s VD', '.model QN NPN BF=200', '+ IS=1e-14', '.model vd VDMOS(pchan VTO=-3 Rd=0.1)');
    expect(models).toEqual([{ name: 'QN', type: 'npn', params: { bf: 200, is: 1e-14 }, flags: [] }, { name: 'vd', type: 'vdmos', params: { vto: -3, rd: 0.1 }, flags: ['pchan'] }]);
    expect(elements.map(({ nodes }) => nodes.length)).toEqual([4, 3]);
  });

  test('what the engine does not know is left out and said', () => {
    const { models, notices } = document('.model A D(IS=1e-14 FOO=3)', '.model B BSIM9(X=1)', '.model C NMOS(LEVEL=54)', '.tran 1u 1m', '.options reltol=1e-4 gmin acct', '.temp 40');
    expect(models).toEqual([{ name: 'A', type: 'd', params: { is: 1e-14 }, flags: [] }]);
    expect(notices.map(({ line }) => line)).toEqual([2, 3, 4, 5, 6, 6]);
  });

  test('temperature and options', () => {
    expect(document('.temp 40', '.options tnom=25 reltol=1m')).toMatchObject({ temp: 40, options: { tnom: 25, reltol: 1e-3 } });
  });

  test('1M is a thousandth, and said so', () => {
    const { elements, notices } = document('R1 a b 1M', 'R2 a b 1MEG', 'R3 a b 1m');
    expect(elements.map(({ value }) => value)).toEqual([1e-3, 1e6, 1e-3]);
    expect(notices).toEqual([{ line: 2, text: 'R1: 1M is a thousandth in a deck; a million is written MEG.' }]);
  });

  test('elements of other letters stand as boxes with a notice', () => {
    expect(document('E1 out 0 in 0 10').elements[0]).toMatchObject({ letter: 'E', nodes: ['out', '0', 'in', '0'], text: '10' });
    expect(document('K1 L1 L2 0.9').elements[0]).toMatchObject({ letter: 'K', nodes: [], text: 'L1 L2 0.9' });
  });
});

describe('fact lines', () => {
  test('values by the vocabulary', () => {
    const { factLines, notices } = document('R1 a 0 1k', '*@R1 pmax=0.25W VMAX=250 wire = no range=1k..10k part="two words" fuse=2 package=0805 note=a = b ; c');
    expect(factLines).toEqual([{ line: 3, name: 'R1', facts: {
      pmax: 0.25, vmax: 250, wire: false, range: [1_000, 10_000], part: 'two words', fuse: 2, package: '0805', note: 'a = b ; c',
    } }]);
    expect(notices).toEqual([]);
  });

  test('unknown keys and values are kept and told; nothing is an error', () => {
    const { factLines, notices } = document('R1 a 0 1k', '*@R1 shape=round pmax=lots wire=maybe vmax', '*@R1', '*@', '*@ R1 hfe_min=-5 =3 ; cut');
    expect(factLines.map(({ facts }) => facts)).toEqual([{ shape: 'round', pmax: 'lots', wire: 'maybe' }, { hfe_min: -5 }]);
    expect(notices.map(({ line }) => line)).toEqual([3, 3, 3, 3, 4, 5, 6, 6]);
  });
});
