import { parentPort } from 'node:worker_threads';
import { Simulation } from 'eecircuit-engine';
import { openHost } from './engine-host.mjs';

const run = await openHost(Simulation, (message, transfer) => parentPort.postMessage(message, transfer));
parentPort.on('message', run);
