import type { Finding } from '@/lib/netlist/findings/finding';
import type { CheckedCopy } from '@/lib/review/check-copy';

/** A finding of a rule that does not exist, for tests of what a review makes of findings. */
export function findingOf(more: Partial<Finding> = {}): Finding {
  const fingerprint = more.fingerprint ?? `f-${more.rule ?? 'rule'}-${more.refs?.join('-') ?? ''}`;
  return {
    id: fingerprint, fingerprint, rule: 'rule', outcome: 'fail', severity: 'stop', confidence: 'proven', refs: ['R1'], nets: [],
    holdPoint: null, fromVolts: null, scenario: null, state: 'as drawn', corner: 'typ', message: 'A finding.', evidence: [], ...more,
  };
}

export const checkedWith = (findings: readonly Finding[]): CheckedCopy => ({ findings, rules: { rule: { version: 1, parameters: {} } }, volts: {}, sourceKnown: () => true });
