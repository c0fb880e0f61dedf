import { families, type Family, type Kind } from './kind';
import { kindIds, type KindId } from './kind-id';
import { acMainsKind } from './ac-mains/kind';
import { airCoreCoilKind } from './air-core-coil/kind';
import { boxKind } from './box/kind';
import { capacitorKind } from './capacitor/kind';
import { dcSourceKind } from './dc-source/kind';
import { dcSupplyKind } from './dc-supply/kind';
import { diodeKind } from './diode/kind';
import { earthKind } from './earth/kind';
import { fuseKind } from './fuse/kind';
import { inductorKind } from './inductor/kind';
import { ledKind } from './led/kind';
import { netNameKind } from './net-name/kind';
import { nmosKind } from './nmos/kind';
import { noteKind } from './note/kind';
import { npnKind } from './npn/kind';
import { plugContactKind } from './plug-contact/kind';
import { pmosKind } from './pmos/kind';
import { pnpKind } from './pnp/kind';
import { polarisedCapacitorKind } from './polarised-capacitor/kind';
import { removableLeadKind } from './removable-lead/kind';
import { resistorKind } from './resistor/kind';
import { schottkyKind } from './schottky/kind';
import { signalGeneratorKind } from './signal-generator/kind';
import { switchKind } from './switch/kind';
import { testPointKind } from './test-point/kind';
import { zenerKind } from './zener/kind';
import { zeroVoltKind } from './zero-volt/kind';

/** Every kind with all its halves; a kind that lacks one fails the type check. */
export const kindRegistry: Readonly<Record<KindId, Kind>> = {
  nmos: nmosKind,
  pmos: pmosKind,
  npn: npnKind,
  pnp: pnpKind,
  'signal-generator': signalGeneratorKind,
  'air-core-coil': airCoreCoilKind,
  inductor: inductorKind,
  'dc-source': dcSourceKind,
  'dc-supply': dcSupplyKind,
  'ac-mains': acMainsKind,
  fuse: fuseKind,
  diode: diodeKind,
  schottky: schottkyKind,
  zener: zenerKind,
  led: ledKind,
  resistor: resistorKind,
  capacitor: capacitorKind,
  'polarised-capacitor': polarisedCapacitorKind,
  switch: switchKind,
  'plug-contact': plugContactKind,
  'removable-lead': removableLeadKind,
  'test-point': testPointKind,
  'zero-volt': zeroVoltKind,
  earth: earthKind,
  'net-name': netNameKind,
  note: noteKind,
  box: boxKind,
};

export function kindOf(id: KindId): Kind {
  return kindRegistry[id];
}

/** Kinds of the drawer by family, both in the order of the job. Boxes come from decks only and are not offered. */
export const kindsByFamily: readonly { readonly family: Family; readonly kinds: readonly Kind[] }[] = families.map(
  (family) => ({ family, kinds: kindIds.filter((id) => id !== 'box').map(kindOf).filter((kind) => kind.family === family) }),
);
