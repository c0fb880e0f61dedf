import type { Sheet } from '@/lib/document/records';
import { gateStage } from '@/lib/document/testing/gate-stage';
import { partAt, sheetOf, wireOf } from '@/lib/document/testing/sheet-builder';

/** Electrical parts of one stage: coil, its diode, MOSFET, generator, gate resistor, pull-down, indicator with its resistor. */
const partsOfStage = 8;

/** `count` driver stages side by side on one supply; each stage has its own generator. Marks (0 V, names) come on top of `parts`. */
export function manyStages(parts: number): Sheet {
  const stages = Array.from({ length: Math.ceil((parts - 1) / partsOfStage) }, (_, index) => stage(index + 1));
  return sheetOf({
    title: `${parts} parts`,
    parts: [
      partAt('dc-source', 'V1', 0, 0, { facts: { value: 15, role: 'supply' } }), partAt('zero-volt', 'Z1', 0, 40), partAt('net-name', 'N1', 0, -40, { facts: { name: 'SUPPLY' } }),
      ...stages.flatMap((one) => one.parts),
    ],
    wires: [wireOf('V1:-', 'Z1:1'), wireOf('V1:+', 'N1:1'), ...stages.flatMap((one) => one.wires)],
    holdPoints: gateStage().holdPoints.map(({ scenario: _, ...point }) => point),
  });
}

function stage(n: number) {
  const x = 400 * ((n % 8) + 1);
  const y = 500 * Math.floor(n / 8);
  const name = (ref: string) => `${ref}${n}`;
  const marks = { supply: `N${n}01`, gate: `N${n}02` };
  const grounds = [1, 2, 3, 4].map((index) => `Z${n}0${index}`);
  return {
    parts: [
      partAt('air-core-coil', name('L'), x + 100, y, { facts: { value: 180e-6 } }),
      partAt('diode', name('D'), x + 140, y, { facts: { vr_max: 600 } }),
      partAt('nmos', name('Q'), x + 100, y + 100, { facts: { vds_max: 450, vgs_max: 20, vth_min: 2, vth_typ: 3, vth_max: 4, rds_on: 0.2, id_max: 20, pmax: 125 } }),
      partAt('signal-generator', name('G'), x - 100, y + 150, { facts: { high: 11, low: 0 } }),
      partAt('resistor', `R${n}1`, x, y + 100, { facts: { value: 10, pmax: 0.25, vmax: 250 } }),
      partAt('resistor', `R${n}2`, x + 50, y + 150, { facts: { value: 22_000, pmax: 0.25, vmax: 250 } }),
      partAt('led', `D${n}00`, x + 220, y + 50, { facts: { vf: 2, if_max: 0.02 } }),
      partAt('resistor', `R${n}3`, x + 220, y, { facts: { value: 1_000, pmax: 0.25, vmax: 250 } }),
      partAt('net-name', marks.supply, x + 100, y - 60, { facts: { name: 'SUPPLY' } }),
      partAt('net-name', marks.gate, x + 50, y + 60, { facts: { name: `GATE${n}` } }),
      ...grounds.map((ref, index) => partAt('zero-volt', ref, x + 60 * index, y + 220)),
    ],
    wires: [
      wireOf(`${marks.supply}:1`, `${name('L')}:1`), wireOf(`${name('L')}:2`, `${name('Q')}:D`), wireOf(`${name('D')}:A`, `${name('Q')}:D`),
      wireOf(`${name('D')}:K`, `${marks.supply}:1`), wireOf(`${name('Q')}:S`, `${grounds[0]}:1`), wireOf(`${name('G')}:+`, `R${n}1:1`),
      wireOf(`R${n}1:2`, `${marks.gate}:1`), wireOf(`${marks.gate}:1`, `${name('Q')}:G`), wireOf(`R${n}2:1`, `${marks.gate}:1`),
      wireOf(`R${n}2:2`, `${grounds[1]}:1`), wireOf(`${name('G')}:-`, `${grounds[2]}:1`), wireOf(`R${n}3:1`, `${marks.supply}:1`),
      wireOf(`R${n}3:2`, `D${n}00:A`), wireOf(`D${n}00:K`, `${name('Q')}:D`),
    ],
  };
}
