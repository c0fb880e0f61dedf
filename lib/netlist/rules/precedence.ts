import type { Finding } from '../findings/finding';
import type { Collected } from './collect';

/** One cause, one finding: which rule stands instead of which, for the parts it covers (`docs/rules.md`, "States"). */
interface Precedence {
  readonly instead: string;
  readonly of: readonly string[];
  /** Further condition on the finding that gives way. */
  readonly when?: (loser: Finding) => boolean;
}

const precedences: readonly Precedence[] = [
  { instead: 'indicator-at-stage', of: ['led-resistor-undersized', 'led-overcurrent', 'resistor-dissipation', 'resistor-voltage-rating'] },
  { instead: 'lifted-lead', of: ['gate-floating'], when: (loser) => loser.severity !== 'stop' },
];

const covers = (winner: Collected, loser: Collected): boolean => [...loser.ids].every((id) => winner.ids.has(id));

function givesWay(loser: Collected, all: readonly Collected[]): boolean {
  return precedences.some(({ instead, of, when }) => of.includes(loser.finding.rule) && loser.finding.outcome === 'fail'
    && (when?.(loser.finding) ?? true)
    && all.some((winner) => winner.finding.rule === instead && winner.finding.outcome === 'fail' && covers(winner, loser)));
}

/** Findings that stand once each cause is said once. */
export const settle = (all: readonly Collected[]): readonly Collected[] => all.filter((one) => !givesWay(one, all));
