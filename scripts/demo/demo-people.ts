import { randomInt } from 'node:crypto';
import type { BenchRole } from '@/lib/schemas/bench';

/** What somebody is in the demo; the first two have the bench role member. */
export type DemoPart = 'maker' | 'reviewer' | 'mentor' | 'steward' | 'member';

export interface DemoPerson { readonly key: string; readonly name: string; readonly email: string; readonly part: DemoPart; readonly role: BenchRole }

const person = (key: string, name: string, part: DemoPart): DemoPerson => ({
  key, name, part, email: `${key}@northgate.test`, role: part === 'mentor' || part === 'steward' ? part : 'member',
});

/** The people of the demo bench, invented. */
export const demoPeople = [
  person('ines', 'Ines Okafor', 'maker'), person('tomasz', 'Tomasz Hale', 'reviewer'), person('ruth', 'Ruth Adeyemi', 'mentor'),
  person('marek', 'Marek Solano', 'mentor'), person('noor', 'Noor Castellan', 'steward'), person('kofi', 'Kofi Mensah', 'member'),
  person('lena', 'Lena Brandt', 'member'),
] as const;

export const demoBench = { slug: 'northgate', name: 'Northgate Makerspace Power Lab' } as const;

/** Letters and digits that cannot be mistaken for one another. */
const alphabet = 'abcdefghijkmnopqrstuvwxyzABCDEFGHJKLMNPQRSTUVWXYZ23456789';

/** A random password of letters and digits: 12 of 57, some 70 bits. */
export const demoPassword = (): string => Array.from({ length: 12 }, () => alphabet[randomInt(alphabet.length)]).join('');
