/** How far a circuit is signed off, for the ladder's upper bar. */
export interface LadderSigned {
  /** Volts up to which the revision on show is signed; null when it is not. */
  readonly to: number | null;
  /** Sign-off of an earlier revision, which does not cover what is on show. */
  readonly past: { readonly letter: string; readonly to: number } | null;
  /** A sign-off of the revision on show that is void. */
  readonly struck: number | null;
  /** What the bar means, in words. */
  readonly words: string;
  readonly short: string;
}

/** A stop that blocks a hold point and those above it. */
export interface LadderFlag {
  readonly holdPoint: string;
  /** Numbers of the margin's entries. */
  readonly numbers: readonly number[];
}
