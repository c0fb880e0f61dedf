// The file checker: npm run -s check -- FILE… [--json]. Runs the TypeScript sources as they stand, right after npm ci.
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { register } from 'tsx/esm/api';

const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '..');
const folders = [process.cwd(), process.env.INIT_CWD ?? process.cwd()];
register({ tsconfig: path.join(root, 'tsconfig.json') });
process.chdir(root);

const { checkCommand } = await import('../lib/check/check-command.ts');
process.exitCode = await checkCommand(process.argv.slice(2), {
  out: (text) => process.stdout.write(text),
  err: (text) => process.stderr.write(text),
}, folders);
