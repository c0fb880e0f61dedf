import { netWords } from '../../connectivity/net-words';
import { isInternal, isOptical, isTransistor } from '../../circuit/part-nature';
import type { Remedy } from '../../findings/finding';
import type { Net, Netlist, NetlistPart } from '../../netlist';
import { pinReference } from '../../connectivity/pin-reference';
import { kindOf } from '../../kinds/kind-registry';
import type { Outcome, Rule, RuleInput } from '../rule';
import { everywhere } from '../support/outcome';

const parameters = {
  leastPins: { value: 2, unit: '', words: 'pins that a net must join', source: 'common practice, no source' },
} as const;

type Input = RuleInput<typeof parameters>;

interface Lone {
  readonly net: Net;
  readonly part: NetlistPart;
  readonly pin: string;
}

/** An earth mark is a connection by itself, 0 V is what volts are counted from; light drives an optocoupler's base; the inside of a part is nobody's to join. */
function loneOf({ netlist }: Input, net: Net): Lone | null {
  if (net.facts.kind === 'earth' || net.name === '0') return null;
  const part = netlist.parts.find((one) => Object.values(one.pins).includes(net.name));
  const pin = part && Object.keys(part.pins).find((name) => part.pins[name] === net.name);
  if (!part || pin === undefined || isInternal(part) || (isOptical(part) && pin === 'B')) return null;
  return { net, part, pin };
}

/** A control pin left open is never meant, so no mark is offered for it. */
function remedyOf({ part, pin }: Lone): Remedy {
  const isControl = isTransistor(part) && kindOf(part.kind).engine.controlPins.includes(pin);
  if (isControl || part.kind === 'test-point') return { words: `Join ${pinReference(part, pin)} to the net it belongs to.` };
  return { words: `Join ${pinReference(part, pin)}, or mark it left open if that is meant.`, edits: [{ edit: 'leave open', part: part.ref, pin }] };
}

function judge(netlist: Netlist, lone: Lone, leastPins: number): Outcome {
  const { net, part, pin } = lone;
  const reference = pinReference(part, pin);
  const base = {
    severity: 'caution', target: { part: [part.id], pin: [pin] }, refs: [part.ref], nets: [net.name],
    evidence: [{ entity: net.name, quantity: 'pins', value: net.pins.length, unit: '', source: 'sheet', limit: leastPins, limitSource: 'a net joins at least two pins' }],
  } as const;
  if (part.leftOpen.includes(pin)) return everywhere({ ...base, outcome: 'pass', message: `${reference} is left open on purpose`, evidence: [{ entity: reference, quantity: 'left open', value: true, unit: '', source: 'sheet' }] });
  const named = net.givenNames.length > 0 ? ` on ${netWords(netlist, net.name)}` : '';
  return everywhere({ ...base, outcome: 'fail', message: `${reference}${named} is joined to nothing else`, remedy: remedyOf(lone) });
}

export const lonePin: Rule<typeof parameters> = {
  id: 'lone-pin', version: 1, title: 'Pin joined to nothing', severity: 'caution', needs: 'topology', parameters,
  check: (input) => input.netlist.nets
    .filter((net) => net.pins.length > 0 && net.pins.length < input.parameters.leastPins)
    .flatMap((net) => loneOf(input, net) ?? [])
    .map((lone) => judge(input.netlist, lone, input.parameters.leastPins)),
};
