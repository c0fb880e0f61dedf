import type { ReviewPicture } from '@/lib/review/review-view';
import type { Circuit } from '@/lib/schemas/circuit';

type PlanRow = { readonly revisionId: string; readonly name: string; readonly volts: number };

/** The highest hold point with a standing sign-off that has not run out, of the newest revision that has one. */
export function reachedOf(picture: ReviewPicture, circuitId: string, plans: readonly PlanRow[], now: Date): Circuit['reached'] {
  for (const revision of picture.revisions.filter((each) => each.circuitId === circuitId)) {
    const signed = picture.signOffs
      .filter((row) => row.revisionId === revision.id && row.standing === 1 && row.until > now)
      .flatMap((row) => plans.filter(({ revisionId, name }) => revisionId === revision.id && name === row.holdPoint).map(({ volts }) => ({ row, volts })))
      .sort((a, b) => b.volts - a.volts)[0];
    if (signed) return { letter: revision.letter, holdPoint: signed.row.holdPoint, volts: signed.volts, until: signed.row.until.toISOString() };
  }
  return null;
}
