import { withParameter, type RuleCase } from '../testing/rule-case';
import { control, deck, fetFacts, heaterStage, lead, nFet, pFet, resistor } from '../testing/stage-deck';

const stage = (pullDown: string, facts?: string): string =>
  deck(heaterStage(), nFet(facts), resistor('R3', 'inner', 'gate', '10'), lead('J1', 'drv', 'inner'), control(), pullDown);

/** 1 µA through R against V_GS(th) minimum 2 V: caution from 200 kΩ, stop above 1 MΩ. */
const atCaution: RuleCase = { name: '200 kΩ: leakage makes just 0.1 of the threshold', deck: stage(resistor('R2', 'gate', '0', '200k')), expect: { outcome: 'fail', severity: 'caution', refs: ['R2', 'Q1', 'J1'], says: 'lifts Q1 gate to 200 mV' } };
const atStop: RuleCase = { name: '1 MΩ: leakage makes just 0.5 of the threshold', deck: stage(resistor('R2', 'gate', '0', '1meg')), expect: { outcome: 'fail', severity: 'caution' } };
const bipolar = (ohms: string): string => deck(
  heaterStage(), 'Q1 drain base 0 QN\n*@Q1 kind=NPN hfe_min=100 vceo_max=60 ic_max=1', resistor('RB', 'inner', 'base', '1k'), lead('J1', 'drv', 'inner'), control('5'), ohms,
);
const baseLeak: RuleCase = { name: 'base held by 22 kΩ', deck: bipolar(resistor('R2', 'base', '0', '22k')), expect: { outcome: 'pass' } };

export const cases: readonly RuleCase[] = [
  { name: 'pull-down on the generator’s side', deck: stage(resistor('R2', 'drv', '0', '22k')), expect: { outcome: 'fail', severity: 'stop', refs: ['J1', 'Q1', 'R2'], says: /^J1 lifted: Q1 gate has no DC path to source/, state: 'lifted J1' } },
  { name: 'no pull-down at all', deck: stage(''), expect: { outcome: 'fail', severity: 'stop', refs: ['J1', 'Q1'], says: 'J1 lifted: Q1 gate has no DC path to source' } },
  { name: 'two leads in a row are one cause', deck: deck(heaterStage(), nFet(), lead('J1', 'drv', 'mid'), lead('W2', 'mid', 'gate'), control()), expect: { outcome: 'fail', severity: 'stop', says: 'J1 or W2 lifted' } },
  { name: 'contacts of one plug open together', deck: deck(heaterStage(), nFet(), lead('J1', 'drv', 'gate'), 'RJ2 ret 0 1m\n*@RJ2 kind=lead part_of=J1', 'V2 drv ret 0\n*@V2 role=generator high=10', resistor('R2', 'drv', 'ret', '22k')), expect: { outcome: 'fail', severity: 'stop', says: /^J1 lifted/ } },
  { name: 'P-channel without its own pull-up', deck: deck('V1 vbus 0 12\n*@V1 role=supply\nRL drain 0 24\n*@RL load=heater', pFet(), lead('J1', 'drv', 'gate'), control()), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'bipolar base left open', deck: bipolar(''), expect: { outcome: 'fail', severity: 'stop', says: 'Q1 base has no DC path to emitter' } },
  { name: '22 kΩ on the gate’s side', deck: stage(resistor('R2', 'inner', '0', '22k')), expect: { outcome: 'pass', says: /J1 lifted: 22 kΩ keep/ } },
  { name: '22 kΩ at the gate itself', deck: stage(resistor('R2', 'gate', '0', '22k')), expect: { outcome: 'pass' } },
  baseLeak,
  { name: 'the lead is in the load, not on the way to the gate', deck: deck('V1 vbus 0 12\n*@V1 role=supply', lead('W1', 'vbus', 'hot'), 'RL hot drain 24\n*@RL load=heater', nFet(), resistor('R3', 'drv', 'gate', '10'), resistor('R2', 'drv', '0', '22k'), control()), expect: { outcome: 'pass' } },
  { name: 'just under: 199 kΩ', deck: stage(resistor('R2', 'gate', '0', '199k')), expect: { outcome: 'pass' } },
  atCaution,
  atStop,
  { name: 'just over: 1.01 MΩ', deck: stage(resistor('R2', 'gate', '0', '1.01meg')), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'I_GSS of the sheet', deck: stage(resistor('R2', 'inner', '0', '1meg'), `${fetFacts} igss=100n`), expect: { outcome: 'pass' } },
  { name: 'no threshold given', deck: stage(resistor('R2', 'inner', '0', '22k'), 'vds_max=100 vgs_max=20 rds_on=40m'), expect: { outcome: 'undetermined', says: 'V_GS(th) minimum' } },
  { name: 'a typical threshold alone decides what it can', deck: stage(resistor('R2', 'inner', '0', '2meg'), 'vds_max=100 vth_typ=3 rds_on=40m'), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'no lead on the sheet', deck: deck(heaterStage(), nFet(), resistor('R3', 'drv', 'gate', '10'), control()), expect: { outcome: 'none' } },
  { name: 'not driven as drawn: gate-floating speaks', deck: deck(heaterStage(), nFet(), resistor('R3', 'inner', 'gate', '10'), lead('J1', 'off', 'inner')), expect: { outcome: 'none' } },
  withParameter(atCaution, 'cautionShare', 0.2, { outcome: 'pass' }),
  withParameter(atStop, 'stopShare', 0.4, { outcome: 'fail', severity: 'stop' }),
  withParameter(baseLeak, 'baseOff', 0.02, { outcome: 'fail', severity: 'stop' }),
];
