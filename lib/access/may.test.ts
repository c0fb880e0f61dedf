import { describe, expect, it } from 'vitest';
import { may, type Standing } from './may';
import { actions, roles, type Action, type Role } from './rights';

const standing = (role: Role, more: Partial<Standing> = {}): Standing => ({ role, ...more });

describe('may', () => {
  it('gives a guest nothing but reading the circuit', () => {
    const all = { poster: true, maker: true, contributor: false, reviewer: true, author: true };
    expect(actions.filter((action) => may(action, standing('guest', all)))).toEqual(['read the circuit']);
  });

  it('lets only makers edit, cut and ask, whatever their role', () => {
    for (const action of ['edit the sheet', 'cut a revision', 'ask for review'] as const) {
      for (const role of roles.filter((role) => role !== 'guest')) {
        expect(may(action, standing(role, { maker: true })), `${action} ${role}`).toBe(true);
        expect(may(action, standing(role, { poster: true, maker: false })), `${action} ${role}`).toBe(false);
      }
    }
  });

  it('never lets a contributor sign, nor anybody whose contribution is not known', () => {
    expect(may('sign off', standing('mentor', { contributor: false }))).toBe(true);
    expect(may('sign off', standing('mentor', { contributor: true }))).toBe(false);
    expect(may('sign off', standing('mentor'))).toBe(false);
    expect(may('sign off', standing('member', { contributor: false }))).toBe(false);
    expect(may('sign off', standing('steward', { contributor: false }))).toBe(false);
  });

  it('asks a member to be named before asking for changes, a mentor not, a steward never', () => {
    expect(may('ask for changes', standing('member'))).toBe(false);
    expect(may('ask for changes', standing('member', { reviewer: true }))).toBe(true);
    expect(may('ask for changes', standing('mentor'))).toBe(true);
    expect(may('ask for changes', standing('steward', { reviewer: true }))).toBe(false);
  });

  it('fails closed on what it does not know', () => {
    expect(may('fly' as Action, standing('steward'))).toBe(false);
    expect(may('read the circuit', standing('owner' as Role))).toBe(false);
    expect(may('read the circuit', standing('constructor' as Role))).toBe(false);
    expect(may('toString' as Action, standing('steward'))).toBe(false);
  });
});
