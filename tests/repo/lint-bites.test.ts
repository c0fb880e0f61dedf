import { ESLint } from 'eslint';
import { describe, expect, it } from 'vitest';
import { root } from './tracked-files';

const eslint = new ESLint({ cwd: root });

async function complaints(file: string, code: string): Promise<readonly string[]> {
  const [result] = await eslint.lintText(code, { filePath: file });
  return (result?.messages ?? []).map((message) => `${message.ruleId}: ${message.message}`);
}

/** For each rule: code that it must refuse, and the nearest code that it must not. */
const cases: readonly { readonly rule: string; readonly refused: readonly (readonly [string, string])[]; readonly taken: readonly (readonly [string, string])[] }[] = [
  {
    rule: 'holdoff/import-direction',
    refused: [
      ['lib/netlist/x.ts', "import { a } from '../document/records';\nexport const b = a;\n"],
      ['lib/netlist/x.ts', "import fs from 'node:fs';\nexport const b = fs;\n"],
      ['lib/netlist/x.ts', "import { a } from '@/lib/netlist/netlist';\nexport const b = a;\n"],
      ['lib/access/x.ts', "import { a } from '@/lib/review/cut-revision';\nexport const b = a;\n"],
      ['lib/document/x.ts', "export { a } from '@/components/ui/button';\n"],
      ['components/x.tsx', "import { database } from '@/db/client';\nexport const b = database;\n"],
      ['realtime/client/x.ts', "import { a } from '../server/main';\nexport const b = a;\n"],
      ['lib/review/x.ts', "export const b = () => import('@/app/page');\n"],
      ['db/x.ts', "import { a } from '@/scripts/start/ports.mjs';\nexport const b = a;\n"],
    ],
    taken: [
      ['lib/netlist/x.ts', "import { z } from 'zod';\nexport const b = z;\n"],
      ['lib/review/x.ts', "import { a } from '@/lib/access/gate';\nexport const b = a;\n"],
      ['app/x/page.tsx', "import { database } from '@/db/client';\nexport const b = database;\n"],
    ],
  },
  {
    rule: 'holdoff/environment-once',
    refused: [
      ['lib/review/x.ts', 'export const a = process.env.PUBLIC_URL;\n'],
      ['app/x.ts', "export const a = process['env'];\n"],
      ['components/x.ts', 'const { env } = process;\nexport const a = env;\n'],
    ],
    taken: [['lib/env/x.ts', 'export const a = process.env;\n'], ['lib/review/x.ts', 'export const a = process.cwd();\n']],
  },
  {
    rule: 'holdoff/sql-in-db',
    refused: [['lib/review/x.ts', "import { sql } from 'drizzle-orm';\nexport const a = sql;\n"], ['app/x.ts', "import mysql from 'mysql2/promise';\nexport const a = mysql;\n"]],
    taken: [['db/queries/x.ts', "import { sql } from 'drizzle-orm';\nexport const a = sql;\n"]],
  },
  {
    rule: 'holdoff/named-exports',
    refused: [['lib/review/x.ts', 'export default 1;\n'], ['lib/review/x.ts', "export * from './y';\n"]],
    taken: [['app/x/page.tsx', 'export default function Page() { return null; }\n'], ['lib/review/x.ts', "export { a } from './y';\n"]],
  },
  {
    rule: 'max-lines',
    refused: [['lib/review/x.ts', 'export const a = 1;\n'.repeat(601).replace(/a/g, 'a')]],
    taken: [['lib/review/x.ts', 'export const a = 1;\n']],
  },
  { rule: 'no-console', refused: [['lib/review/x.ts', "console.log('x');\n"]], taken: [['scripts/x.mjs', "console.log('x');\n"]] },
  { rule: 'no-warning-comments', refused: [['lib/review/x.ts', `// ${'TO'}${'DO'}: later\n`]], taken: [['lib/review/x.ts', '// Because of the driver.\n']] },
];

describe.each(cases)('$rule', ({ rule, refused, taken }) => {
  it.each(refused)('refuses in %s: %s', async (file, code) => {
    expect((await complaints(file, code)).filter((line) => line.startsWith(rule))).not.toEqual([]);
  });
  it.each(taken)('takes in %s: %s', async (file, code) => {
    expect((await complaints(file, code)).filter((line) => line.startsWith(rule))).toEqual([]);
  });
});

it('tells where the code belongs', async () => {
  const [line] = await complaints('lib/access/x.ts', "import { a } from '@/lib/review/cut-revision';\nexport const b = a;\n");
  expect(line).toMatch(/belongs in a folder above both/);
});

it('cannot be switched off in a file', async () => {
  const found = await complaints('lib/review/x.ts', '/* eslint-disable */\nexport default process.env;\n');
  expect(found.some((line) => line.startsWith('holdoff/named-exports'))).toBe(true);
  expect(found.some((line) => line.startsWith('holdoff/environment-once'))).toBe(true);
});
