import { withParameter, type RuleCase } from '../testing/rule-case';
import { control, deck, heaterStage, nFet, pFet, resistor } from '../testing/stage-deck';

const facts = (max: string, spec: string): string => `vds_max=100 vgs_max=20 vth_min=1 vth_typ=2 ${max === '' ? '' : `vth_max=${max}`} rds_on=40m ${spec === '' ? '' : `rds_on_spec_vgs=${spec}`}`;
const stage = (high: string, part: string, load = heaterStage()): string => deck(load, nFet(part), resistor('R3', 'drv', 'gate', '10'), resistor('R2', 'drv', '0', '1meg'), control(high, 'role=pin'));
const starved: RuleCase = { name: '3.3 V on a part with a threshold of up to 4 V', deck: stage('3.3', facts('4', '10')), expect: { outcome: 'fail', severity: 'stop', refs: ['Q1', 'V2'], says: 'it barely conducts below 4.5 V' } };
const weak: RuleCase = { name: '5 V on a part stated at 10 V', deck: stage('5', facts('3', '10')), expect: { outcome: 'fail', severity: 'caution', refs: ['Q1', 'V2'], says: 'promised at 10 V only' } };
const undriven: RuleCase = { name: 'no high level drawn', deck: stage('0', facts('3', '10')), expect: { outcome: 'undetermined', says: 'V2’s high level' } };
/** KP = 1/(½·40 mΩ·7 V) = 7.14 A/V²: at 3.6 V of drive 1.29 A. */
const heavy = deck('V1 vbus 0 12\n*@V1 role=supply', 'RL vbus drain 4', '*@RL load=heater');

export const cases: readonly RuleCase[] = [
  starved,
  weak,
  { name: 'its channel cannot carry the load', deck: stage('3.6', facts('3', '10'), heavy), expect: { outcome: 'fail', severity: 'stop', says: 'its channel gives' } },
  { name: 'just under the threshold and half a volt', deck: stage('3.49', facts('3', '3.5')), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'just over it', deck: stage('3.51', facts('3', '3.6')), expect: { outcome: 'pass' } },
  { name: 'just under 0.95 of what is stated', deck: stage('9.49', facts('3', '10')), expect: { outcome: 'fail', severity: 'caution' } },
  { name: 'just over 0.95 of what is stated', deck: stage('9.51', facts('3', '10')), expect: { outcome: 'pass' } },
  { name: 'a divider takes too much', deck: deck(heaterStage(), nFet(facts('3', '10')), resistor('R3', 'drv', 'gate', '10k'), resistor('R2', 'gate', '0', '10k'), control('12')), expect: { outcome: 'fail', severity: 'caution' } },
  { name: '10 V on a part stated at 10 V', deck: stage('10', facts('4', '10')), expect: { outcome: 'pass' } },
  { name: '5 V on a logic-level part', deck: stage('5', facts('2', '4.5')), expect: { outcome: 'pass' } },
  { name: 'a P-channel part pulled down to 0 V', deck: deck('V1 vbus 0 12\n*@V1 role=supply\nRL drain 0 24\n*@RL load=heater', pFet(facts('-3', '-10')), resistor('R2', 'gate', 'vbus', '10k'), resistor('R3', 'gate', 'drv', '10'), control('12')), expect: { outcome: 'pass' } },
  { name: 'no threshold maximum', deck: stage('10', facts('', '10')), expect: { outcome: 'undetermined', says: 'V_GS(th) maximum' } },
  { name: 'a typical threshold can fail it', deck: stage('2.4', facts('', '10')), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'the VTO of its card counts as typical', deck: deck(heaterStage(), nFet('vds_max=100 vgs_max=20 rds_on=40m rds_on_spec_vgs=10'), resistor('R3', 'drv', 'gate', '10'), resistor('R2', 'drv', '0', '1meg'), control('3.4', 'role=pin'), '.model NM NMOS(VTO=3 KP=20)'), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'no V_GS for R_DS(on)', deck: stage('10', facts('4', '')), expect: { outcome: 'undetermined', says: 'rds_on_spec_vgs' } },
  undriven,
  { name: 'never driven on', deck: deck(heaterStage(), nFet(facts('3', '10'), '0')), expect: { outcome: 'not applicable' } },
  { name: 'no MOSFET', deck: heaterStage(), expect: { outcome: 'none' } },
  withParameter(starved, 'aboveThreshold', -1, { outcome: 'fail', severity: 'stop' }),
  withParameter({ ...weak, name: '3.4 V on a light load', deck: stage('3.4', facts('3', '3.5')) }, 'aboveThreshold', 0.2, { outcome: 'pass' }),
  withParameter(weak, 'specShare', 0.4, { outcome: 'pass' }),
  withParameter(undriven, 'drivenVolts', -1, { outcome: 'fail', severity: 'stop' }),
];
