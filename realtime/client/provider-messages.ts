import * as decoding from 'lib0/decoding';
import * as encoding from 'lib0/encoding';
import { messageYjsSyncStep1, messageYjsSyncStep2, messageYjsUpdate } from 'y-protocols/sync';
import { messageAwareness, messageSync } from 'y-websocket';

/** What the y-websocket provider says to its socket, as far as it matters here. */
export function asksForState(message: Uint8Array): boolean {
  const from = decoding.createDecoder(message);
  return decoding.readVarUint(from) === messageSync && decoding.readVarUint(from) === messageYjsSyncStep1;
}

function sync(step: number, update: Uint8Array): Uint8Array {
  return encoding.encode((to) => {
    encoding.writeVarUint(to, messageSync);
    encoding.writeVarUint(to, step);
    encoding.writeVarUint8Array(to, update);
  });
}

/** The answer to the provider's first question: the sheet. */
export const stateMessage = (update: Uint8Array) => sync(messageYjsSyncStep2, update);

/** Somebody's committed edit. */
export const updateMessage = (update: Uint8Array) => sync(messageYjsUpdate, update);

/** A sign of life without content: the provider drops a socket that is silent for 30 s. */
export const signOfLife = encoding.encode((to) => {
  encoding.writeVarUint(to, messageAwareness);
  encoding.writeVarUint8Array(to, encoding.encode((states) => encoding.writeVarUint(states, 0)));
});
