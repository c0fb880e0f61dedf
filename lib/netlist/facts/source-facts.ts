import { flag, label, quantity } from './fact-definition';

/** Facts of sources, controls and controller pins. */
export const sourceFacts = {
  role: label('Role', ['pin', 'supply', 'mains', 'generator', 'battery', 'ground-return']),
  high: quantity('High level', 'V', -100_000, 100_000),
  low: quantity('Low level', 'V', -100_000, 100_000),
  duty: quantity('Duty', '%', 0, 100),
  fsw: quantity('Switching frequency', 'Hz', 0, 1e10),
  rs: quantity('Source resistance', 'Ω', 0, 1e12),
  ilim: quantity('Current limit', 'A', 0, 10_000),
  mains: flag('Fed from the mains', 'V'),
  rms: quantity('Voltage (rms)', 'V', 0, 100_000),
  f: quantity('Frequency', 'Hz', 0, 1e10),
  peak: quantity('Peak voltage', 'V', 0, 200_000),
  logic_level: quantity('Logic level', 'V', 0, 100),
  io_max: quantity('Pin current maximum', 'A', 0, 100),
  uvlo: quantity('Under-voltage lockout', 'V', 0, 100),
  isolated: flag('Isolated from the mains'),
  fuse: flag('Fused', 'A'),
  bleeder: flag('Bleeder fitted', 'Ω'),
  earth: flag('Earthed'),
} as const;
