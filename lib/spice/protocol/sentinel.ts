const header = [
  'Title: sentinel',
  'Date: none',
  'Plotname: Sentinel',
  'Flags: real',
  'No. Variables: 1',
  'No. Points: 1',
  'Variables:',
  '\t0\tsentinel\tvoltage',
  'Binary:',
  '',
].join('\n');

/**
 * A valid raw file that no run wrote. The engine package reads its result file after every run and never settles when
 * it is missing or unreadable; this one is always there, and its title is nobody's nonce.
 */
export function sentinelRawFile(): Uint8Array {
  const text = new TextEncoder().encode(header);
  const bytes = new Uint8Array(text.length + 8);
  bytes.set(text);
  return bytes;
}
