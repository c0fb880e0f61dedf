import { readPrivate } from '../data/private-file.mjs';

/** @typedef {{ email: string, password: string, part: string }} DemoAccount */

const order = ['maker', 'reviewer', 'mentor', 'steward', 'member'];

/** One line for each demo account, the maker first; none when this data folder has no demo. @param {string} file */
export function demoAccountLines(file) {
  /** @type {DemoAccount[]} */
  const accounts = readPrivate(file) ?? [];
  return accounts
    .toSorted((a, b) => order.indexOf(a.part) - order.indexOf(b.part))
    .map(({ email, password, part }) => `${email}  ${password}  ${part}`);
}
