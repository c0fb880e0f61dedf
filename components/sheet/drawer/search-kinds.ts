import type { Kind } from '@/lib/netlist/kinds/kind';
import { kindsByFamily } from '@/lib/netlist/kinds/kind-registry';

/** Words that people type for a kind beside its title. */
const otherWords: Readonly<Record<string, string>> = {
  nmos: 'nmos nmosfet nchannel fet transistor switch', pmos: 'pmos pmosfet pchannel fet transistor switch', npn: 'bipolar bjt', pnp: 'bipolar bjt', 'signal-generator': 'drive pulse pwm source',
  'air-core-coil': 'inductor winding work load', inductor: 'coil choke', 'dc-source': 'voltage battery', 'dc-supply': 'bench psu limit', 'ac-mains': 'voltage line',
  schottky: 'rectifier', diode: 'rectifier flyback', zener: 'clamp', led: 'light indicator', resistor: 'ohm', capacitor: 'cap', 'polarised-capacitor': 'electrolytic cap',
  switch: 'contact', 'plug-contact': 'connector socket jack', 'removable-lead': 'wire link jumper', 'test-point': 'probe', 'zero-volt': 'ground gnd common return',
  earth: 'ground protective', 'net-name': 'label', note: 'text words',
};

export interface KindGroup {
  readonly family: string;
  readonly kinds: readonly Kind[];
}

/** Kinds whose title, letter or usual words begin like every word typed, by family; all of them for an empty search. */
export function searchKinds(typed: string): readonly KindGroup[] {
  const words = typed.toLowerCase().replaceAll('-', '').split(/[\s,]+/).filter(Boolean);
  const fits = (kind: Kind) => {
    const own = `${kind.title} ${kind.letter ?? ''} ${otherWords[kind.id] ?? ''}`.toLowerCase().replace(/(\w)-(\w)/g, '$1$2 $2').split(/[\s,]+/);
    return words.every((word) => own.some((one) => one.startsWith(word)));
  };
  return kindsByFamily.map(({ family, kinds }) => ({ family, kinds: kinds.filter(fits) })).filter((group) => group.kinds.length > 0);
}
