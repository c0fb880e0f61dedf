import { capVoltageRating } from './cap-voltage-rating/rule';
import { designatorTwice } from './designator-twice/rule';
import { deviceVoltageRating } from './device-voltage-rating/rule';
import { flybackMissing } from './flyback-missing/rule';
import { flybackReversed } from './flyback-reversed/rule';
import { gateFloating } from './gate-floating/rule';
import { indicatorAtStage } from './indicator-at-stage/rule';
import { ledOvercurrent } from './led-overcurrent/rule';
import { ledResistorMissing } from './led-resistor-missing/rule';
import { ledResistorUndersized } from './led-resistor-undersized/rule';
import { ledReverseVoltage } from './led-reverse-voltage/rule';
import { ledStringHeadroom } from './led-string-headroom/rule';
import { liftedLead } from './lifted-lead/rule';
import { logicLevelMismatch } from './logic-level-mismatch/rule';
import { lonePin } from './lone-pin/rule';
import { marginAtMains } from './margin-at-mains/rule';
import { netNamesAlike } from './net-names-alike/rule';
import { ngateOvervoltage } from './ngate-overvoltage/rule';
import { pgateOvervoltage } from './pgate-overvoltage/rule';
import { pulldownGateSide } from './pulldown-gate-side/rule';
import { pulldownTooStrong } from './pulldown-too-strong/rule';
import { pulldownTooWeak } from './pulldown-too-weak/rule';
import { ratingMissing } from './rating-missing/rule';
import { resistorDissipation } from './resistor-dissipation/rule';
import { resistorVoltageRating } from './resistor-voltage-rating/rule';
import { schematicHygiene } from './schematic-hygiene/rule';
import { valueMissing } from './value-missing/rule';
import type { Rule, RuleParameters } from './rule';

/** Forgets which parameters a rule names, so that rules stand in one list. */
const entry = <P extends RuleParameters>(rule: Rule<P>): Rule => rule as unknown as Rule;

/** Every rule, in the order in which findings are listed. One line a rule. */
export const ruleRegistry: readonly Rule[] = [
  entry(liftedLead),
  entry(gateFloating),
  entry(pulldownGateSide),
  entry(pulldownTooWeak),
  entry(pulldownTooStrong),
  entry(indicatorAtStage),
  entry(ledResistorMissing),
  entry(ledResistorUndersized),
  entry(ledOvercurrent),
  entry(ledStringHeadroom),
  entry(ledReverseVoltage),
  entry(resistorDissipation),
  entry(resistorVoltageRating),
  entry(capVoltageRating),
  entry(deviceVoltageRating),
  entry(marginAtMains),
  entry(ngateOvervoltage),
  entry(pgateOvervoltage),
  entry(logicLevelMismatch),
  entry(flybackMissing),
  entry(flybackReversed),
  entry(ratingMissing),
  entry(valueMissing),
  entry(lonePin),
  entry(netNamesAlike),
  entry(designatorTwice),
  entry(schematicHygiene),
];

export const ruleById = (id: string): Rule | undefined => ruleRegistry.find((rule) => rule.id === id);
