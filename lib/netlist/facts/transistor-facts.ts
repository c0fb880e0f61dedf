import { quantity } from './fact-definition';

/**
 * Data-sheet facts of transistors. P-channel and PNP sheets print voltages and currents with a minus; the bounds admit
 * both signs and whoever reads such a fact takes its magnitude.
 */
export const transistorFacts = {
  vds_max: quantity('V_DS maximum', 'V', -20_000, 20_000),
  vgs_max: quantity('V_GS maximum', 'V', -100, 100),
  vth_min: quantity('V_GS(th) minimum', 'V', -20, 20),
  vth_typ: quantity('V_GS(th) typical', 'V', -20, 20),
  vth_max: quantity('V_GS(th) maximum', 'V', -20, 20),
  rds_on: quantity('R_DS(on)', 'Ω', 1e-5, 10_000),
  rds_on_spec_vgs: quantity('V_GS for R_DS(on)', 'V', -30, 30),
  id_max: quantity('I_D maximum', 'A', -5_000, 5_000),
  qg: quantity('Gate charge Q_g', 'C', 0, 1e-4),
  qgd: quantity('Gate-drain charge Q_gd', 'C', 0, 1e-4),
  v_plateau: quantity('Plateau V_GS', 'V', -30, 30),
  gfs: quantity('Transconductance g_fs', 'S', 0, 10_000),
  igss: quantity('Gate leakage I_GSS', 'A', 0, 1e-2),
  ciss: quantity('C_iss', 'F', 0, 1e-5),
  coss: quantity('C_oss', 'F', 0, 1e-5),
  crss: quantity('C_rss', 'F', 0, 1e-5),
  e_as: quantity('Avalanche energy E_AS', 'J', 0, 1_000),
  vsd: quantity('Body diode V_SD', 'V', -5, 5),
  vceo_max: quantity('V_CEO maximum', 'V', -20_000, 20_000),
  vebo_max: quantity('V_EBO maximum', 'V', -100, 100),
  ic_max: quantity('I_C maximum', 'A', -5_000, 5_000),
  ib_max: quantity('I_B maximum', 'A', -1_000, 1_000),
  hfe_min: quantity('h_FE minimum', '', 0.1, 100_000),
  hfe_typ: quantity('h_FE typical', '', 0.1, 100_000),
  hfe_sat: quantity('h_FE for saturation', '', 0.1, 100_000),
  vbe: quantity('V_BE', 'V', -5, 5),
  vce_sat: quantity('V_CE(sat)', 'V', -20, 20),
  icbo: quantity('Collector leakage I_CBO', 'A', 0, 1),
} as const;
