import { expect, it } from 'vitest';
import { parseRawFile } from './raw-file';
import { sentinelRawFile } from './sentinel';

function rawFile(header: readonly string[], numbers: readonly number[]): Uint8Array {
  const text = new TextEncoder().encode(`${header.join('\n')}\nBinary:\n`);
  const bytes = new Uint8Array(text.length + numbers.length * 8);
  bytes.set(text);
  const view = new DataView(bytes.buffer);
  numbers.forEach((value, index) => view.setFloat64(text.length + index * 8, value, true));
  return bytes;
}

const sweep = [
  'Title: n1', 'Date: none', 'Plotname: Transient Analysis', 'Flags: real', 'No. Variables: 2', 'No. Points: 3',
  'Variables:', '\t0\ttime\ttime', '\t1\tV(B)\tvoltage',
];

it('sorts interleaved points into vectors and lowers their names', () => {
  const plot = parseRawFile(rawFile(sweep, [0, 10, 1, 11, 2, 12]));
  expect(plot?.title).toBe('n1');
  expect([...plot?.real.get('time') ?? []]).toEqual([0, 1, 2]);
  expect([...plot?.real.get('v(b)') ?? []]).toEqual([10, 11, 12]);
});

it('splits complex points', () => {
  const header = sweep.map((line) => line.replace('Flags: real', 'Flags: complex').replace('Points: 3', 'Points: 1'));
  const plot = parseRawFile(rawFile(header, [1, 0, 0.5, -0.5]));
  expect(plot?.real.get('v(b)')?.[0]).toBe(0.5);
  expect(plot?.imaginary.get('v(b)')?.[0]).toBe(-0.5);
});

it('refuses a file that breaks off', () => {
  expect(parseRawFile(rawFile(sweep, [0, 10, 1, 11, 2]))).toBeNull();
  expect(parseRawFile(new TextEncoder().encode('Title: n1\nno data'))).toBeNull();
  expect(parseRawFile(new Uint8Array())).toBeNull();
});

it('reads the sentinel as a raw file of nobody', () => {
  expect(parseRawFile(sentinelRawFile())).toMatchObject({ title: 'sentinel', plotName: 'Sentinel', pointCount: 1 });
});
