/**
 * Every refusal the product can give: its status, stated once, and what a person reads. `title` says what happened;
 * `advice` says what to do next. The sentence about this very case is the problem's own `detail`.
 */
export const codes = {
  'not-signed-in': { status: 401, title: 'You are not signed in.', advice: 'Sign in, then try again.' },
  'sign-in-failed': { status: 401, title: 'E-mail and password do not match.', advice: 'Check both and try again.' },
  'not-found': { status: 404, title: 'There is nothing here.', advice: 'Check the address, or ask whoever sent it.' },
  'not-allowed': { status: 403, title: 'Your role does not allow this.', advice: 'Ask a maker of the circuit or a steward of the bench.' },
  'cross-origin': { status: 403, title: 'This request came from another site.', advice: 'Open Holdoff itself and do it there.' },
  'sign-in-again': { status: 403, title: 'You signed in more than 12 hours ago.', advice: 'Sign in again, then repeat the step.' },
  contributor: { status: 403, title: 'You made part of this revision.', advice: 'A mentor who made no part of it can do this.' },
  'input-wrong': { status: 422, title: 'Something in this request is not right.', advice: 'Correct what is named and send it again.' },
  'deck-unreadable': { status: 422, title: 'The deck cannot be read.', advice: 'Correct the line that is named; nothing was changed.' },
  'hold-point-unknown': { status: 422, title: 'The plan has no such hold point.', advice: 'Choose a hold point of this revision.' },
  'key-reused': { status: 422, title: 'This idempotency key was used for another request.', advice: 'Use a new key for a new request.' },
  'sheet-moved': { status: 409, title: 'The sheet has moved on.', advice: 'Look at the newest changes, then try again.' },
  'not-in-review': { status: 409, title: 'This revision is not under review.', advice: 'Its maker asks for review of it, or cuts a new revision and asks for that.' },
  'newer-revision': { status: 409, title: 'A newer revision is under review.', advice: 'Open the newer revision.' },
  'stale-hash': { status: 409, title: 'This is not the drawing you looked at.', advice: 'Reload the revision and look at it again.' },
  'open-stop': { status: 409, title: 'A stop is open at or below this hold point.', advice: 'The maker removes its cause and cuts a new revision.' },
  objection: { status: 409, title: 'Changes are asked for.', advice: 'Whoever asked lifts it, or a steward overrides it with a reason.' },
  'must-answer': { status: 409, title: 'A note that must be answered is open.', advice: 'Answer it and have it resolved.' },
  'rule-error': { status: 409, title: 'A check did not finish.', advice: 'Cut the revision again; a check in error never counts as passed.' },
  'which-source': { status: 409, title: 'The plan does not say which source this hold point raises.', advice: 'Name the source in the plan and cut a new revision.' },
  'already-signed': { status: 409, title: 'This hold point has just been signed off by someone else.', advice: 'Reload the revision.' },
  'already-withdrawn': { status: 409, title: 'This sign-off was already withdrawn.', advice: 'Reload the revision.' },
  'already-lifted': { status: 409, title: 'This request for changes is no longer in force.', advice: 'Reload the revision.' },
  'revision-closed': { status: 409, title: 'This revision takes no further review.', advice: 'Cut a new revision.' },
  'thread-state': { status: 409, title: 'The note cannot go to that state from where it is.', advice: 'Reload the margin.' },
  archived: { status: 409, title: 'This circuit is archived.', advice: 'Restore it first.' },
  'slug-taken': { status: 409, title: 'A bench of this name exists.', advice: 'Choose another name.' },
  'method-unknown': { status: 405, title: 'This address does not take that kind of request.', advice: 'See the API description.' },
  'too-large': { status: 413, title: 'This is too large.', advice: 'Send less at once.' },
  'content-type': { status: 415, title: 'Only application/json is taken here.', advice: 'Send JSON and say so in Content-Type.' },
  'too-many': { status: 429, title: 'Too many requests.', advice: 'Wait a moment, then try again.' },
  internal: { status: 500, title: 'Something went wrong on our side.', advice: 'Try again; if it stays, quote the reference.' },
  busy: { status: 503, title: 'The checker is busy.', advice: 'Try again in a few seconds.' },
  unavailable: { status: 503, title: 'Holdoff cannot save right now.', advice: 'Your work is kept; try again in a few seconds.' },
} as const satisfies Record<string, { status: number; title: string; advice: string }>;

export type ProblemCode = keyof typeof codes;

/** The status of a code: the only place where the two meet. */
export function statusOf(code: ProblemCode): number {
  return codes[code].status;
}
