// Served from /vendor/ beside its two imports; `scripts/build/vendor-engine.mjs` puts them there.
import { openHost } from './engine-host.mjs';
import { Simulation } from './eecircuit-engine.mjs';

const run = await openHost(Simulation, (message, transfer) => globalThis.postMessage(message, transfer));
globalThis.addEventListener('message', (event) => run(event.data));
