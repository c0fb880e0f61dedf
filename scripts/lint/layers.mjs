const core = ['lib/netlist'];
const sheet = [...core, 'lib/document'];
const contracts = ['lib/schemas', 'lib/errors', ...core];
const ground = ['lib/env', 'lib/log'];
const services = ['lib/access', 'lib/check', 'lib/spice', 'lib/document', 'db', ...contracts, ...ground];

/**
 * The ground plan: which folder may import which, ground floor first (DEVELOPERS.md has the same table). A file belongs to the
 * longest folder here that it is in. `packages` limits what may come from node_modules.
 * @type {readonly { folder: string, may: readonly string[] | 'everything', packages?: readonly string[], holds: string }[]}
 */
export const layers = [
  { folder: 'lib/netlist', may: [], packages: ['zod', '@noble/hashes'], holds: 'the electrical core, pure' },
  { folder: 'lib/spice', may: core, holds: 'the circuit engine behind one guarded call' },
  { folder: 'lib/check', may: ['lib/netlist', 'lib/spice'], holds: 'checkSheet, the one path from netlist to findings' },
  { folder: 'lib/document', may: core, holds: 'the sheet as a Yjs document' },
  { folder: 'lib/editor', may: sheet, packages: ['yjs', 'lib0', 'zod', 'ulid', 'elkjs'], holds: 'tools and commands without React' },
  { folder: 'lib/schemas', may: core, packages: ['zod'], holds: 'inputs and outputs, one file a noun' },
  { folder: 'lib/errors', may: [], packages: ['zod'], holds: 'codes and words for people' },
  { folder: 'lib/env', may: [], holds: 'the environment, parsed once' },
  { folder: 'lib/log', may: ['lib/env'], holds: 'structured logs' },
  { folder: 'db', may: [...contracts, 'lib/document', ...ground], holds: 'tables, queries and mutations: the only SQL' },
  { folder: 'lib/access', may: ['db', ...contracts, ...ground], holds: 'who may: gates and the one decision point' },
  { folder: 'lib/auth', may: services, holds: 'sessions, passwords, tokens' },
  { folder: 'lib/rooms', may: [...services, 'realtime'], holds: 'the live sheet as web sees it: stored copy, edits through the one writer' },
  { folder: 'lib/review', may: [...services, 'lib/rooms'], holds: 'use cases of the review' },
  { folder: 'lib/circuits', may: [...services, 'lib/rooms', 'lib/review'], holds: 'use cases of circuits and benches' },
  { folder: 'lib/http', may: [...services, 'lib/auth', 'lib/review', 'lib/circuits', 'lib/rooms'], holds: 'the one wrapper of route handlers' },
  { folder: 'lib', may: services, holds: 'use cases and services' },
  { folder: 'realtime/client', may: [...sheet, ...contracts, 'realtime'], holds: 'the browser half of the rooms' },
  { folder: 'realtime/server', may: [...services, 'lib/auth', 'lib/review', 'realtime'], holds: 'the rooms: admission, durability, fan-out' },
  { folder: 'realtime/testing', may: 'everything', holds: 'the rooms under simulated faults' },
  { folder: 'realtime', may: [...sheet, ...contracts], holds: 'the protocol that both halves share' },
  { folder: 'components', may: [...contracts, ...sheet, 'lib/check', 'lib/spice', 'lib/editor', 'realtime/client', 'realtime'], holds: 'React without data access' },
  { folder: 'app', may: 'everything', holds: 'routes only' },
  { folder: 'tests', may: 'everything', holds: 'tests' },
  { folder: 'scripts', may: 'everything', holds: 'start, test and bench' },
];

/** Nothing imports these but themselves and each other. */
const tops = new Set(['app', 'tests', 'scripts']);

/** The layer of a path from the root, or undefined for files at the top. @param {string} file */
export function layerOf(file) {
  return layers
    .filter(({ folder }) => file === folder || file.startsWith(`${folder}/`))
    .toSorted((a, b) => b.folder.length - a.folder.length)[0];
}

/**
 * Why `from` may not import `to`, or undefined when it may. Paths from the root.
 * @param {string} from
 * @param {string} to
 */
export function importRefusal(from, to) {
  const [here, there] = [layerOf(from), layerOf(to)];
  if (!here || !there || here.folder === there.folder) return undefined;
  // Tests stand beside their source and may use what tests use.
  const testFile = /\.test\.[cm]?tsx?$/.test(from);
  if (tops.has(there.folder)) {
    return tops.has(here.folder) || testFile ? undefined : `${there.folder}/ is imported by nothing below it. Move what ${here.folder}/ needs down to ${here.folder}/ or a folder it may import (${list(here.may)}).`;
  }
  if (here.may === 'everything' || testFile || here.may.includes(there.folder)) return undefined;
  return `${here.folder}/ (${here.holds}) may import ${list(here.may)}, not ${there.folder}/ (${there.holds}). Code that needs both belongs in a folder above both, such as lib/review/ or app/.`;
}

/** Why `from` may not import a package, or undefined. @param {string} from @param {string} name */
export function packageRefusal(from, name) {
  const here = layerOf(from);
  if (!here?.packages || /\.test\.[cm]?tsx?$/.test(from)) return undefined;
  if (here.packages.some((allowed) => name === allowed || name.startsWith(`${allowed}/`))) return undefined;
  return `${here.folder}/ (${here.holds}) may use ${list(here.packages)} only, not ${name}. Put the code that needs it in a folder above.`;
}

/** @param {readonly string[] | 'everything'} names */
function list(names) {
  return typeof names === 'string' || names.length === 0 ? 'nothing else' : names.join(', ');
}
