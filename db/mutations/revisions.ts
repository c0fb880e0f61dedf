import { desc, eq, isNull, and } from 'drizzle-orm';
import type { Finding } from '@/lib/netlist/findings/finding';
import type { Netlist } from '@/lib/netlist/netlist';
import type { CircuitId, RevisionId } from '../authorized';
import type { Transaction } from '../client';
import {
  findings, revisionContributors, revisionHoldPoints, revisionNets, revisionParts, revisionPins, revisionReviewers, revisions,
} from '../schema/revisions';

export type NewRevision = Omit<typeof revisions.$inferInsert, 'circuitId' | 'askedAt' | 'askedBy'> & { readonly circuitId: CircuitId };

export async function newestNumber(tx: Transaction, circuit: CircuitId): Promise<number> {
  const [row] = await tx.select({ number: revisions.number }).from(revisions).where(eq(revisions.circuitId, circuit)).orderBy(desc(revisions.number)).limit(1);
  return row?.number ?? 0;
}

export async function insertRevision(tx: Transaction, row: NewRevision): Promise<void> {
  await tx.insert(revisions).values(row);
}

/** Rows a statement; each stays far below the packet limit. */
const batch = 400;

async function inBatches<Row>(rows: readonly Row[], insert: (rows: Row[]) => Promise<unknown>): Promise<void> {
  for (let from = 0; from < rows.length; from += batch) await insert(rows.slice(from, from + batch));
}

/** Parts, pins and nets of the netlist as rows of their own. */
export async function insertNetlistRows(tx: Transaction, revisionId: string, netlist: Netlist): Promise<void> {
  await inBatches(netlist.parts, (parts) => tx.insert(revisionParts).values(
    parts.map(({ id, ref, kind, facts }) => ({ revisionId, partId: id, ref, kind, facts: { ...facts } as typeof revisionParts.$inferInsert.facts })),
  ));
  await inBatches(netlist.nets, (nets) => tx.insert(revisionNets).values(
    nets.map(({ name, givenNames, facts }) => ({ revisionId, name, givenNames: [...givenNames], facts: { ...facts } as typeof revisionNets.$inferInsert.facts })),
  ));
  const pins = netlist.parts.flatMap(({ id, pins: ends }) => Object.entries(ends).map(([pin, net]) => ({ revisionId, partId: id, pin, net })));
  await inBatches(pins, (rows) => tx.insert(revisionPins).values(rows));
}

export async function insertHoldPoints(
  tx: Transaction, revisionId: string, plan: Netlist['holdPoints'], sourceKnown: (name: string) => boolean,
): Promise<void> {
  if (plan.length === 0) return;
  await tx.insert(revisionHoldPoints).values(plan.map(({ name, scenario, source, volts, amps }, position) => (
    { revisionId, position, name, scenario: scenario ?? null, source: source ?? null, volts, amps, sourceKnown: sourceKnown(name) }
  )));
}

export async function insertFindings(tx: Transaction, revisionId: string, all: readonly Finding[]): Promise<void> {
  await inBatches(all.map((finding, position) => ({ finding, position })), (rows) => tx.insert(findings).values(rows.map(({ finding, position }) => ({
    revisionId, position, fingerprint: finding.fingerprint, rule: finding.rule, outcome: finding.outcome, severity: finding.severity,
    refs: finding.refs, fromVolts: finding.fromVolts, finding,
  }))));
}

export async function insertContributors(tx: Transaction, revisionId: string, personIds: readonly string[]): Promise<void> {
  if (personIds.length > 0) await tx.insert(revisionContributors).values(personIds.map((personId) => ({ revisionId, personId })));
}

/** Puts a revision up for review; false when it was already. */
export async function markAsked(tx: Transaction, revision: RevisionId, askedBy: string, askedAt: Date): Promise<boolean> {
  const [result] = await tx.update(revisions).set({ askedAt, askedBy }).where(and(eq(revisions.id, revision), isNull(revisions.askedAt)));
  return result.affectedRows > 0;
}

export async function insertReviewers(tx: Transaction, revisionId: string, personIds: readonly string[], askedAt: Date): Promise<void> {
  if (personIds.length > 0) await tx.insert(revisionReviewers).values(personIds.map((personId) => ({ revisionId, personId, askedAt })));
}
