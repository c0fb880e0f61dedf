import type { CheckResult } from '@/lib/check/check-netlist';
import { voltsByHoldPoint } from '@/lib/check/net-volts';
import type { Finding } from '@/lib/netlist/findings/finding';

/** What the landing page's picture needs of a check: what failed, and the volts of each net at the hold point shown. */
export interface LandingPicture {
  readonly findings: readonly Finding[];
  /** Rules that ran on the circuit. */
  readonly checks: number;
  readonly volts: Readonly<Record<string, number>>;
}

/** Numbers to four digits: the picture does not depend on the last bit of an engine. */
const rounded = (value: number): number => Number(value.toPrecision(4));

export function landingPicture({ findings, points }: CheckResult, holdPoint: string): LandingPicture {
  return {
    findings: findings.filter((finding) => finding.outcome === 'fail').map((finding) => ({
      ...finding,
      evidence: finding.evidence.filter((evidence) => evidence.quantity === 'crossing').map((evidence) => ({ ...evidence, value: typeof evidence.value === 'number' ? rounded(evidence.value) : evidence.value })),
    })),
    checks: findings.filter((finding) => finding.outcome !== 'not applicable').length,
    volts: Object.fromEntries(Object.entries(voltsByHoldPoint(points)[holdPoint] ?? {}).map(([net, volts]) => [net, rounded(volts)])),
  };
}
