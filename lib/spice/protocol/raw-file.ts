/** One plot of an ngspice binary raw file. */
export interface RawPlot {
  readonly title: string;
  readonly plotName: string;
  readonly pointCount: number;
  /** Vector name, lower case, to its values; the first vector of a sweep is its axis. */
  readonly real: ReadonlyMap<string, Float64Array>;
  /** Imaginary parts; empty for a real plot. */
  readonly imaginary: ReadonlyMap<string, Float64Array>;
}

const dataMark = new TextEncoder().encode('Binary:\n');

/** Reads the first plot of a raw file. Null when the bytes are no complete raw file. */
export function parseRawFile(bytes: Uint8Array): RawPlot | null {
  const mark = indexOfBytes(bytes, dataMark);
  if (mark < 0) return null;
  const header = readHeader(new TextDecoder('latin1').decode(bytes.subarray(0, mark)));
  if (header === null) return null;

  const start = mark + dataMark.length;
  const width = header.complex ? 2 : 1;
  const numberCount = header.names.length * header.pointCount * width;
  if (bytes.length < start + numberCount * 8) return null;

  const view = new DataView(bytes.buffer, bytes.byteOffset + start, numberCount * 8);
  const column = (vector: number, part: number): Float64Array => {
    const values = new Float64Array(header.pointCount);
    for (let point = 0; point < header.pointCount; point += 1) {
      const index = (point * header.names.length + vector) * width + part;
      values[point] = view.getFloat64(index * 8, true);
    }
    return values;
  };

  return {
    title: header.title,
    plotName: header.plotName,
    pointCount: header.pointCount,
    real: new Map(header.names.map((name, vector) => [name, column(vector, 0)])),
    imaginary: new Map(header.complex ? header.names.map((name, vector) => [name, column(vector, 1)]) : []),
  };
}

interface RawHeader {
  readonly title: string;
  readonly plotName: string;
  readonly complex: boolean;
  readonly pointCount: number;
  readonly names: readonly string[];
}

function readHeader(text: string): RawHeader | null {
  const lines = text.split('\n');
  const field = (name: string): string | undefined =>
    lines.find((line) => line.startsWith(`${name}:`))?.slice(name.length + 1).trim();
  const vectorCount = Number(field('No. Variables'));
  const pointCount = Number(field('No. Points'));
  const listStart = lines.findIndex((line) => line.startsWith('Variables:'));
  if (!Number.isSafeInteger(vectorCount) || !Number.isSafeInteger(pointCount) || listStart < 0) return null;

  const names = lines
    .slice(listStart + 1, listStart + 1 + vectorCount)
    .map((line) => line.trim().split(/\s+/)[1]?.toLowerCase());
  if (names.length !== vectorCount || names.some((name) => name === undefined)) return null;

  return {
    title: field('Title') ?? '',
    plotName: field('Plotname') ?? '',
    complex: (field('Flags') ?? '').includes('complex'),
    pointCount,
    names: names as string[],
  };
}

function indexOfBytes(bytes: Uint8Array, wanted: Uint8Array): number {
  const last = bytes.length - wanted.length;
  for (let at = bytes.indexOf(wanted[0] ?? 0); at >= 0 && at <= last; at = bytes.indexOf(wanted[0] ?? 0, at + 1)) {
    if (wanted.every((byte, offset) => bytes[at + offset] === byte)) return at;
  }
  return -1;
}
