import type { Circuit } from '../circuit/circuit';
import type { Control } from '../circuit/sources';
import type { PartSetting } from '../kinds/kind-engine';
import type { DriveState } from './point';

/** One state of the drive: what every control and lead is set to. */
export interface Drive {
  readonly state: DriveState;
  /** Control that is high, where there are several. */
  readonly control?: string;
  readonly settings: Readonly<Record<string, PartSetting>>;
}

function setTo(control: Control, level: 'high' | 'low'): PartSetting {
  if (control.openDrain && level === 'high') return { removed: true };
  return { volts: control[level] };
}

function levels(controls: readonly Control[], high: Control | null): Record<string, PartSetting> {
  return Object.fromEntries(controls.map((control) => [control.part.id, setTo(control, control === high ? 'high' : 'low')]));
}

function highStates(controls: readonly Control[]): readonly Drive[] {
  return controls.map((control) => ({
    state: 'high',
    ...(controls.length > 1 ? { control: control.part.ref } : {}),
    settings: levels(controls, control),
  }));
}

/**
 * States that decide currents and volts: as drawn, each control high with the others low, all low. With several controls
 * never all high at once: two switches of a bridge are not meant to conduct together.
 */
export function drivenStates(circuit: Circuit): readonly Drive[] {
  const { controls } = circuit.sources;
  const drawn: Drive = { state: 'as drawn', settings: {} };
  return controls.length === 0 ? [drawn] : [drawn, ...highStates(controls), { state: 'low', settings: levels(controls, null) }];
}

/** States in which something is off or away: controls at high impedance, each lead lifted. */
export function liftedStates(circuit: Circuit): readonly Drive[] {
  const { controls } = circuit.sources;
  const open: readonly Drive[] = controls.length === 0 ? []
    : [{ state: 'high-z', settings: Object.fromEntries(controls.map((control) => [control.part.id, { removed: true }])) }];
  return [...open, ...circuit.leads.map((lead): Drive => ({
    state: `lifted ${lead.name}`,
    settings: Object.fromEntries(lead.parts.map((part) => [part.id, { removed: true }])),
  }))];
}

/** Whether something can be hurt by a supply that is off: a gate whose source falls with it, an LED from a rail to a control. */
function feelsSupplyOff(circuit: Circuit): boolean {
  const driven = new Set(circuit.sources.controls.flatMap(({ out, back }) => [out, back]).filter((net) => net !== '0'));
  return circuit.stages.some(({ transistor, references }) => transistor.kind === 'pmos' || (transistor.kind === 'nmos' && !references.has('0')))
    || circuit.ledBranches.some(({ ends }) => ends.some((net) => driven.has(net)) && !ends.includes('0'));
}

/**
 * Each supply off in turn while the controls are high, and while they are low: only where that makes a difference, a gate that then stands away
 * from its source or an LED that a control then drives backwards.
 */
export function supplyOffStates(circuit: Circuit): readonly Drive[] {
  const { supplies, controls } = circuit.sources;
  if (!feelsSupplyOff(circuit) || supplies.length + controls.length < 2) return [];
  const all = (level: 'high' | 'low') => Object.fromEntries(controls.map((control) => [control.part.id, setTo(control, level)]));
  const drives = controls.length === 0 ? [{}] : [all('high'), all('low')];
  return supplies.flatMap((supply) => drives.map((drive): Drive => ({ state: `off ${supply.ref}`, settings: { ...drive, [supply.id]: { volts: 0 } } })));
}
