import type { FactKey } from '../facts/fact-registry';
import type { ModelCard } from '../netlist';

/** Something a model had to assume because no fact says it. */
export interface Assumption {
  readonly fact: FactKey;
  readonly words: string;
}

/** A model made from data-sheet facts, with what was assumed on the way. */
export interface FittedModel {
  readonly card: Omit<ModelCard, 'name'>;
  readonly assumed: readonly Assumption[];
}

/** A model, or the fact without which there is none. */
export type ModelResult = FittedModel | { readonly missing: FactKey };

/** Boltzmann's constant over the elementary charge, V/K (2019 SI, exact values divided). */
const boltzmannPerCharge = 8.617333262e-5;

/** k·T/q at 25 °C, volts: data-sheet values stand for 25 °C, and models are fitted there. */
export const thermalVoltage = boltzmannPerCharge * 298.15;
