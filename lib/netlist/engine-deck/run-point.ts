import type { Netlist } from '../netlist';
import type { OperatingPoint, Refusal } from '../points/point';
import type { ControlPin } from '../precheck/precheck';
import { buildEngineDeck, type DeckOptions, type EngineDeck } from './build-engine-deck';
import type { PointEngine } from './engine-port';
import { isUndriven } from './gate-leakage';
import { engineRefusal } from './refusal-words';

export type PointRun =
  | { readonly status: 'ok'; readonly op: OperatingPoint; readonly assumed: EngineDeck['assumed'] }
  | { readonly status: 'refused'; readonly refusal: Refusal };

/**
 * One operating point. Where a gate or base reaches 0 V through junctions or channels only, it is run with leakage both
 * ways as well, and refused when the leakage alone decides what that transistor does: then nothing drives it.
 */
export async function runPoint(engine: PointEngine, netlist: Netlist, options: DeckOptions): Promise<PointRun> {
  const deck = buildEngineDeck(netlist, options);
  if ('code' in deck) return { status: 'refused', refusal: deck };
  const run = await runDeck(engine, deck);
  if (run.status === 'refused' || deck.weakControls.length === 0 || options.gateLeakage !== undefined) return run;

  const [into, outOf] = await Promise.all([
    leakyPoint(engine, netlist, { ...options, gateLeakage: 1 }),
    leakyPoint(engine, netlist, { ...options, gateLeakage: -1 }),
  ]);
  const undriven = deck.weakControls.filter((control) => {
    if (isBaseBehindResistor(netlist, control)) return false;
    const card = netlist.models.find(({ name }) => name.toLowerCase() === control.part.model?.toLowerCase());
    return isUndriven(control, { plain: run.op, into, outOf }, card);
  });
  return undriven.length === 0 ? run : { status: 'refused', refusal: undrivenRefusal(undriven) };
}

async function runDeck(engine: PointEngine, deck: EngineDeck): Promise<PointRun> {
  if (deck.request.vectors.length === 0) return { status: 'ok', op: deck.decode({}), assumed: deck.assumed };
  const answer = await engine.simulate(deck.request);
  return 'values' in answer
    ? { status: 'ok', op: deck.decode(answer.values), assumed: deck.assumed }
    : { status: 'refused', refusal: engineRefusal(answer.status, answer.messages, deck.names) };
}

async function leakyPoint(engine: PointEngine, netlist: Netlist, options: DeckOptions): Promise<OperatingPoint | null> {
  const run = await runPoint(engine, netlist, options);
  return run.status === 'ok' ? run.op : null;
}

function undrivenRefusal(undriven: readonly ControlPin[]): Refusal {
  const pins = undriven.map(({ part, pin }) => `${part.ref}:${pin}`);
  return {
    code: 'precheck',
    words: `leakage alone decides what ${pins.join(', ')} does: nothing drives it`,
    nodes: [...new Set(undriven.map(({ net }) => net))],
    parts: [...new Set(undriven.map(({ part }) => part.ref))],
  };
}

/** A base with a series resistor from a pin is no floating input, even while the pin lets go (docs/engine.md 3.6). */
function isBaseBehindResistor({ parts }: Netlist, { part: { kind }, net }: ControlPin): boolean {
  return (kind === 'npn' || kind === 'pnp') && parts.some((other) => other.kind === 'resistor' && Object.values(other.pins).includes(net));
}
