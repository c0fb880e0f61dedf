import { rights, type Action, type Condition, type Role } from './rights';

/** What a caller is to the thing at hand. Absent facts count as false. */
export interface Standing {
  readonly role: Role;
  readonly poster?: boolean;
  readonly maker?: boolean;
  readonly contributor?: boolean;
  readonly reviewer?: boolean;
  readonly author?: boolean;
}

/** The one decision point. Fails closed: an unknown action, role or condition is a no. */
export function may(action: Action, standing: Standing): boolean {
  const condition: Condition | undefined = (rights as Partial<Record<string, Partial<Record<string, Condition>>>>)[action]?.[standing.role];
  return condition !== undefined && holds(condition, standing);
}

function holds(condition: Condition, { poster, maker, contributor, reviewer, author }: Standing): boolean {
  switch (condition) {
    case 'yes': return true;
    case 'maker': return maker === true;
    case 'poster': return poster === true;
    case 'reviewer': return reviewer === true;
    case 'not contributor': return contributor === false;
    case 'author': return author === true;
    case 'author or maker': return author === true || maker === true;
    case 'author or not contributor': return author === true || contributor === false;
    default: return false;
  }
}
