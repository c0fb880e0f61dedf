import { reversedDiodes } from '../../circuit/clamps';
import { switchedCoils, type SwitchedCoil } from '../../circuit/coils';
import type { Circuit } from '../../circuit/circuit';
import type { NetlistPart } from '../../netlist';
import type { Outcome, Rule } from '../rule';
import { everywhere } from '../support/outcome';

const parameters = {};

const evidence = (diode: NetlistPart, value: number) => [{
  entity: diode.ref, quantity: 'conducting while on', value, unit: '', source: 'connections', limit: 0, limitSource: 'a flyback diode blocks while the switch is on',
}];

function outcomesOf(circuit: Circuit, switched: SwitchedCoil): readonly Outcome[] {
  const { coil, stage, side } = switched;
  const wrong = reversedDiodes(circuit, switched);
  const across = circuit.graph.edges.filter((edge) => edge.nature === 'junction' && edge.part.kind !== 'led'
    && [switched.near, switched.far].every((nets) => nets.has(edge.a) || nets.has(edge.b))).map((edge) => edge.part);
  return across.map((diode) => {
    const base = { severity: 'stop', target: { diode: [diode.id], coil: [coil.id] }, refs: [diode.ref, coil.ref, stage.transistor.ref], nets: [diode.pins.A ?? '', diode.pins.K ?? ''] } as const;
    if (!wrong.includes(diode)) return everywhere({ ...base, outcome: 'pass', message: `${diode.ref} blocks while ${stage.transistor.ref} is on`, evidence: evidence(diode, 0) });
    return everywhere({
      ...base, outcome: 'fail', evidence: evidence(diode, 1),
      message: `${diode.ref} is the wrong way round: when ${stage.transistor.ref} closes it shorts the ${side === 'low' ? 'supply' : 'switch'} past ${coil.ref}`,
      remedy: { words: `Turn ${diode.ref} round: stripe (cathode) to plus.`, edits: [{ edit: 'swap pins', part: diode.ref, pins: ['A', 'K'] }] },
    });
  });
}

export const flybackReversed: Rule<typeof parameters> = {
  id: 'flyback-reversed', version: 1, title: 'Flyback diode reversed', severity: 'stop', needs: 'topology', parameters,
  check: ({ circuit }) => circuit.stages.flatMap((stage) => switchedCoils(circuit, stage)).flatMap((switched) => outcomesOf(circuit, switched)),
};
