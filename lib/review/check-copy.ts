import type { NetVolts } from '@/lib/check/net-volts';
import type { Finding } from '@/lib/netlist/findings/finding';
import type { Netlist } from '@/lib/netlist/netlist';
import { checkOnServer } from './check-on-server';

/** What the server's own checks say of a netlist. */
export interface CheckedCopy {
  /** Every outcome, in the collector's order. */
  readonly findings: readonly Finding[];
  /** Version and parameters of every rule that ran. */
  readonly rules: Readonly<Record<string, { version: number; parameters: Record<string, number> }>>;
  readonly volts: NetVolts;
  /** Whether the plan says which source a hold point raises. */
  readonly sourceKnown: (holdPoint: string) => boolean;
}

/** Part of the plan: one hold point, or one scenario as drawn. Everything when left out. */
export interface PlanScope { readonly holdPoint?: string; readonly scenario?: string }

export type Checker = (netlist: Netlist, scope?: PlanScope) => Promise<CheckedCopy>;

const shared = globalThis as typeof globalThis & { holdoffChecker?: Checker | undefined };

/** Checks a netlist, as the server does at a cut and for everyone who asks. */
export const checkCopy: Checker = (netlist, scope) => (shared.holdoffChecker ?? checkOnServer)(netlist, scope);

/** Puts another checker in its place: the model of the review decides its own findings. */
export function replaceChecker(checker: Checker | undefined): void {
  shared.holdoffChecker = checker;
}
