/** Progress for the person at the terminal: plain lines, bold only on a terminal that wants colour. */
const colour = process.stdout.isTTY && !process.env.NO_COLOR;

// A reader that went away (a closed terminal, `| head`) must not end what is running.
for (const stream of [process.stdout, process.stderr]) stream.on('error', () => {});

/** @param {string} text */
export function say(text) {
  process.stdout.write(`${text}\n`);
}

/** A step that begins. @param {string} text */
export function step(text) {
  say(colour ? `\u001b[1m›\u001b[0m ${text}` : `› ${text}`);
}

/** An error's words, without its stack. @param {unknown} error */
export function words(error) {
  return error instanceof Error ? error.message : String(error);
}

/** An end that the person can act on: what, why, what to do. Its message is printed without a stack. */
export class Refusal extends Error {}
