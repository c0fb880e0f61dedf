import { readdirSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { isAlive } from '../machine/processes.mjs';

const userFile = /^in-use-(\d+)$/;

/** Notes that this process serves from a build, so that a later build does not remove it. @param {string} root @param {string} build @returns {() => void} ends it */
export function serveFrom(root, build) {
  const file = path.join(root, build, `in-use-${process.pid}`);
  writeFileSync(file, '');
  return () => rmSync(file, { force: true });
}

/** Removes builds that nobody serves from, but for the one named. @param {string} root @param {string} keep */
export function pruneBuilds(root, keep) {
  for (const name of readdirSync(root)) {
    if (!/^\.next-[0-9a-f]{12}$/.test(name) || name === keep) continue;
    const users = readdirSync(path.join(root, name)).map((file) => Number(userFile.exec(file)?.[1])).filter(Number.isInteger);
    if (!users.some(isAlive)) rmSync(path.join(root, name), { recursive: true, force: true });
  }
}
