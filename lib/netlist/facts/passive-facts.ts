import { flag, label, quantity } from './fact-definition';

/** Facts of diodes, resistors, capacitors, coils and fuses. */
export const passiveFacts = {
  if_max: quantity('Forward current maximum', 'A', 0, 10_000),
  vf: quantity('Forward voltage', 'V', 0, 100),
  i_test: quantity('Current at which it is measured', 'A', 0, 10_000),
  vr_max: quantity('Reverse voltage maximum', 'V', 0, 100_000),
  vz: quantity('Zener voltage', 'V', 0.5, 2_000),
  zz: quantity('Zener impedance', 'Ω', 0, 100_000),
  trr: quantity('Reverse recovery time', 's', 0, 1e-2),
  ifsm: quantity('Surge current', 'A', 0, 100_000),
  colour: label('Colour', ['infrared', 'red', 'amber', 'yellow', 'green', 'blue', 'white', 'ultraviolet']),
  vmax: quantity('Voltage rating', 'V', 0, 200_000),
  vmax_ac: quantity('AC voltage rating (rms)', 'V', 0, 100_000),
  v_nominal: quantity('Nominal voltage', 'V', 0, 100_000),
  pmax: quantity('Power rating', 'W', 0, 1e6),
  imax: quantity('Current rating', 'A', 0, 100_000),
  tolerance: quantity('Tolerance', '%', 0, 100),
  esr: quantity('ESR', 'Ω', 0, 1e6),
  dcr: quantity('Winding resistance', 'Ω', 0, 1e6),
  polarised: flag('Polarised'),
  rth_ja: quantity('Thermal resistance to air', 'K/W', 0, 5_000),
  rth_jc: quantity('Thermal resistance to case', 'K/W', 0, 5_000),
  tj_max: quantity('Junction temperature maximum', '°C', -55, 500),
  coil_v: quantity('Coil voltage', 'V', 0, 10_000),
  coil_i: quantity('Coil current', 'A', 0, 1_000),
  ctr: quantity('Current transfer ratio', '%', 0, 10_000),
} as const;
