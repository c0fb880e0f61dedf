/**
 * `npm start`: everything that the product needs on one machine, from packages to a printed address.
 * `npm run dev`: the same from the sources, with reload. README.md names the variables. Plain Node: it runs before `npm ci`.
 */
import { fileURLToPath } from 'node:url';
import { askedToEnd, interruption, takeInterruptions } from './machine/interruption.mjs';
import { Refusal, say, words } from './machine/say.mjs';
import { announce } from './start/announce.mjs';
import { product } from './start/product.mjs';

const root = fileURLToPath(new URL('..', import.meta.url));
const holdoff = product({ root, dev: process.argv.includes('--dev'), env: process.env });

takeInterruptions(() => {
  say('Stopping at once');
  process.exit(130);
});
process.on('uncaughtException', (error) => void fail(error));
process.on('unhandledRejection', (error) => void fail(error));

const interrupted = new Promise((resolve) => interruption.signal.addEventListener('abort', resolve, { once: true }));

/** @param {unknown} error */
async function fail(error) {
  const asked = interruption.signal.reason === askedToEnd;
  if (!asked) process.stderr.write(`\n${error instanceof Refusal ? error.message : `Holdoff could not run.\n${words(error)}`}\n`);
  await holdoff.stop();
  process.exit(asked ? 0 : 1);
}

try {
  announce(await holdoff.start());
  await interrupted;
  say('Stopping');
  await holdoff.stop();
  say('Stopped');
  process.exit(0);
} catch (error) {
  await fail(error);
}
