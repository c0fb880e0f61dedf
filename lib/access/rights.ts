import { benchRoles } from '@/lib/schemas/bench';

/** What a caller is to a bench: its role there, or a guest with a link to one of its circuits. */
export const roles = ['guest', ...benchRoles] as const;
export type Role = (typeof roles)[number];

/** What must be true of the caller besides the role. */
export type Condition =
  | 'no' | 'yes'
  /** A maker or co-maker of the circuit. */
  | 'maker'
  /** The maker who posted the circuit. */
  | 'poster'
  /** Named as a reviewer of the revision. */
  | 'reviewer'
  /** Made no part of the revision. */
  | 'not contributor'
  /** Whoever wrote, signed or asked. */
  | 'author'
  | 'author or maker'
  | 'author or not contributor';

type Row = Readonly<Record<Role, Condition>>;
const row = (guest: Condition, member: Condition, mentor: Condition, steward: Condition): Row => ({ guest, member, mentor, steward });

/** Who may do what: the one table behind every decision, in HTTP, in the room and in the seed. */
export const rights = {
  'read the circuit': row('yes', 'yes', 'yes', 'yes'),
  /** Who else is on the bench, its list of circuits, the notes in the margin. */
  'read the bench': row('no', 'yes', 'yes', 'yes'),
  'run checks': row('no', 'yes', 'yes', 'yes'),
  'write notes': row('no', 'yes', 'yes', 'yes'),
  'edit own message': row('no', 'author', 'author', 'author'),
  'post a circuit': row('no', 'yes', 'yes', 'yes'),
  'edit the sheet': row('no', 'maker', 'maker', 'maker'),
  'cut a revision': row('no', 'maker', 'maker', 'maker'),
  'ask for review': row('no', 'maker', 'maker', 'maker'),
  'name makers': row('no', 'poster', 'poster', 'yes'),
  'archive the circuit': row('no', 'poster', 'poster', 'yes'),
  'say a note is answered': row('no', 'maker', 'maker', 'maker'),
  'resolve a note': row('no', 'author or maker', 'yes', 'yes'),
  'resolve a note that must be answered': row('no', 'author', 'author or not contributor', 'author'),
  'ask for changes': row('no', 'reviewer', 'yes', 'no'),
  'lift own objection': row('no', 'author', 'author', 'no'),
  'override an objection': row('no', 'no', 'no', 'yes'),
  'sign off': row('no', 'no', 'not contributor', 'no'),
  'withdraw own sign-off': row('no', 'no', 'author', 'no'),
  'withdraw another’s sign-off': row('no', 'no', 'no', 'yes'),
  /** The bench's record is filtered to one's own circuits for a member. */
  'see the audit record': row('no', 'yes', 'yes', 'yes'),
  'see all of the audit record': row('no', 'no', 'yes', 'yes'),
} as const satisfies Record<string, Row>;

export type Action = keyof typeof rights;
export const actions = Object.keys(rights) as Action[];
