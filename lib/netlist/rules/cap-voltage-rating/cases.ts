import { withParameter, type RuleCase } from '../testing/rule-case';
import { deck } from '../testing/stage-deck';

const across = (volts: string, facts: string): string => deck(`V1 vbus 0 ${volts}\n*@V1 role=supply`, 'C1 vbus 0 100u', `*@C1 ${facts}`, 'R1 vbus 0 10k');
/** A 20 V winding, a bridge and a reservoir capacitor: 28 V DC, 34 V unloaded on high mains. */
const bridge = (facts: string): string => deck(
  'V1 a b SIN(0 28.28 50)\n*@V1 rms=20', 'R9 b 0 1meg\n*@R9 pmax=0.25', 'D1 a plus DX\nD2 b plus DX\nD3 0 a DX\nD4 0 b DX', 'C1 plus 0 1000u', `*@C1 ${facts}`, 'RL plus 0 100\n*@RL load=heater',
);
const close: RuleCase = { name: '21 V on 25 V', deck: across('21', 'vmax=25'), expect: { outcome: 'fail', severity: 'caution', says: '84 %' } };
const unloaded: RuleCase = { name: '20 V AC on a 35 V part', deck: bridge('vmax=35'), expect: { outcome: 'fail', severity: 'caution' } };

export const cases: readonly RuleCase[] = [
  { name: '28 V on 25 V', deck: across('28', 'vmax=25'), expect: { outcome: 'fail', severity: 'stop', refs: ['C1'], says: 'C1 stands 28 V' } },
  close,
  { name: 'over at +10 % only', deck: across('23', 'vmax=25 polarised=yes plus=vbus'), expect: { outcome: 'fail', severity: 'caution' } },
  { name: '20 V AC on a 25 V part', deck: bridge('vmax=25'), expect: { outcome: 'fail', severity: 'stop', says: 'unloaded' } },
  unloaded,
  { name: 'just over', deck: across('25.01', 'vmax=25'), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'at the rating it is a caution', deck: across('25', 'vmax=25'), expect: { outcome: 'fail', severity: 'caution' } },
  { name: 'at 80 %', deck: across('20', 'vmax=25'), expect: { outcome: 'pass' } },
  { name: '12 V on 25 V', deck: across('12', 'vmax=25'), expect: { outcome: 'pass' } },
  { name: '20 V AC on a 50 V part', deck: bridge('vmax=50'), expect: { outcome: 'pass' } },
  { name: 'an AC rating: stop above it', deck: deck('V1 l 0 SIN(0 325.27 50)\n*@V1 rms=230', 'C1 l 0 100n\n*@C1 vmax_ac=250', 'R1 l 0 1meg'), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'an AC rating: nothing below it', deck: deck('V1 l 0 SIN(0 325.27 50)\n*@V1 rms=230', 'C1 l 0 100n\n*@C1 vmax_ac=310', 'R1 l 0 1meg'), expect: { outcome: 'pass' } },
  { name: 'behind a capacitor', deck: deck('V1 l 0 SIN(0 33.9 50)\n*@V1 rms=24', 'C9 l a 1u\n*@C9 vmax=100', 'D1 a p DX', 'D2 0 a DX', 'C1 p 0 100u\n*@C1 vmax=25', 'R1 p 0 10k'), expect: { outcome: 'undetermined', says: 'needs transient' } },
  { name: 'no rating', deck: across('12', 'esr=0.1'), expect: { outcome: 'undetermined', says: 'voltage rating' } },
  { name: 'fed by the mains: margin-at-mains speaks', deck: deck('V1 vbus 0 325\n*@V1 role=mains', 'C1 vbus 0 100u\n*@C1 vmax=250', 'R1 vbus 0 100k'), expect: { outcome: 'none' } },
  withParameter(close, 'cautionShare', 0.95, { outcome: 'pass' }),
  withParameter(unloaded, 'noLoadFactor', 1, { outcome: 'fail', severity: 'caution' }),
  withParameter({ ...unloaded, name: '20 V AC on a 40 V part', deck: bridge('vmax=40') }, 'noLoadFactor', 1, { outcome: 'pass' }),
];
