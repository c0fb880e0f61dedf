import { environmentOnce } from './environment-once.mjs';
import { importDirection } from './import-direction.mjs';
import { namedExports } from './named-exports.mjs';
import { sqlInDb } from './sql-in-db.mjs';

/** The project's own lint rules; `tests/repo` shows that each one bites. */
export const holdoff = {
  meta: { name: 'holdoff' },
  rules: {
    'environment-once': environmentOnce,
    'import-direction': importDirection,
    'named-exports': namedExports,
    'sql-in-db': sqlInDb,
  },
};
