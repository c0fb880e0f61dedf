const allowedElements = /^[rclvibefghkdqmxs]/i;
const allowedCommands = /^\.(model|subckt|ends|options|save|op|tran|ac|ic)\b/i;
const unprintable = /[^\x20-\x7e]/;

/**
 * Why a line may not reach the engine; null when it may. Decks are generated, so a refusal is a defect of the generator:
 * this is the second lock behind it. Braces, quotes and command words are what can hang or poison an instance
 * (`docs/engine.md` 1.6).
 */
export function lineFault(line: string): string | null {
  if (unprintable.test(line)) return 'it holds a character that is not plain text';
  if (/[{}'"`;$]/.test(line)) return 'it holds a brace, a quote or a command sign';
  const text = line.trim();
  const allowed = text.startsWith('.') ? allowedCommands.test(text) : allowedElements.test(text);
  return allowed ? null : 'it is no element and no command that the generator writes';
}

/** The whole deck of one run, its title the nonce. */
export function deckText(nonce: string, lines: readonly string[]): string {
  return [nonce, ...lines, '.end', ''].join('\n');
}

/** A title that no other run has; ngspice keeps its case in the raw file. */
export function freshNonce(): string {
  const bytes = crypto.getRandomValues(new Uint8Array(12));
  return `n${Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('')}`;
}
