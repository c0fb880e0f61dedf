import type { DeckNotice, DeckError } from '@/lib/netlist/deck/deck-document';
import { netlistFromDeck } from '@/lib/netlist/deck/netlist-from-deck';
import { readDeck } from '@/lib/netlist/deck/read-deck';
import { asDrawn } from '@/lib/netlist/engine-deck/as-drawn';
import type { PointEngine } from '@/lib/netlist/engine-deck/engine-port';
import type { Finding } from '@/lib/netlist/findings/finding';
import type { PointSet, RunPoint } from '@/lib/netlist/points/point-set';
import type { ParameterValues } from '@/lib/netlist/rules/run-rules';
import { checkNetlist } from './check-netlist';

/** Volts by node, node 0 left out. */
export type NodeVolts = Readonly<Record<string, number>>;

/** What the check says of one deck: the same for a file and for `POST /api/check`. */
export interface DeckReport {
  /** Findings that fail. */
  readonly findings: readonly Finding[];
  readonly undetermined: readonly Finding[];
  /** Lines that cannot be read; what the engine refused and rules that broke down stand with line 0. */
  readonly errors: readonly DeckError[];
  readonly notices: readonly DeckNotice[];
  /** `as drawn` as ngspice itself reads the deck; every other state under its name. */
  readonly op: Readonly<Record<string, NodeVolts>>;
}

export interface DeckCheck {
  readonly report: DeckReport;
  /** False when the deck could not be read at all. */
  readonly readable: boolean;
}

function stateName({ key }: RunPoint): string {
  const control = key.control === undefined ? '' : ` (${key.control})`;
  const level = key.level === 'nominal' ? '' : ` at ${key.level}`;
  const state = `${key.state}${control}${level}`;
  return key.scenario === null ? state : `${key.scenario}/${state}`;
}

function nodeVolts({ op }: RunPoint): NodeVolts {
  return Object.fromEntries(Object.entries(op.volts).filter(([net, volts]) => net !== '0' && Number.isFinite(volts)).map(([net, volts]) => [net.toLowerCase(), volts]));
}

function statesOf(points: PointSet): Record<string, NodeVolts> {
  const shown = points.ok.filter(({ key }) => key.level !== '+10 %' && !key.limitLifted && !(key.state === 'as drawn' && key.level === 'nominal'));
  return Object.fromEntries(shown.map((point) => [stateName(point), nodeVolts(point)]));
}

function refusals(points: PointSet): readonly DeckError[] {
  const reasons = points.refused.filter(({ key }) => key.level !== '+10 %').map(({ key, refusal }) => `${key.state}: ${refusal.words}`);
  return [...new Set(reasons)].map((reason) => ({ line: 0, reason }));
}

const brokenRules = (findings: readonly Finding[]): readonly DeckError[] =>
  findings.filter(({ outcome }) => outcome === 'error').map(({ message }) => ({ line: 0, reason: message }));

/** Reads a deck and checks it: every rule, every state, and the volts of its nodes. Never throws for what a deck says. */
export async function checkDeck(text: string, engine: PointEngine, parameters?: ParameterValues): Promise<DeckCheck> {
  const reading = readDeck(text);
  if (!reading.ok) return { readable: false, report: { findings: [], undetermined: [], errors: reading.errors, notices: [], op: {} } };
  const { netlist, notices } = netlistFromDeck(reading.document);
  const [drawn, { findings, points }] = await Promise.all([
    asDrawn(engine, reading.document),
    checkNetlist(netlist, { engine, ...(parameters ? { parameters } : {}) }),
  ]);
  const boxed = drawn.status === 'refused' && drawn.refusal.code === 'not-run';
  const drawnError = drawn.status === 'refused' ? [{ line: 0, reason: `as drawn: ${drawn.refusal.words}` }] : [];
  return {
    readable: true,
    report: {
      findings: findings.filter(({ outcome }) => outcome === 'fail'),
      undetermined: findings.filter(({ outcome }) => outcome === 'undetermined'),
      errors: unique([...drawnError, ...refusals(points), ...brokenRules(findings)]),
      notices,
      op: boxed ? {} : { ...(drawn.status === 'ok' ? { 'as drawn': drawn.volts } : {}), ...statesOf(points) },
    },
  };
}

function unique(errors: readonly DeckError[]): readonly DeckError[] {
  return errors.filter((error, index) => errors.findIndex(({ reason }) => reason === error.reason) === index);
}
