import { createNodeEngine } from '@/lib/spice/node-engine';
import { checkFile, type FileCheck } from './check-file';
import { fileWords } from './file-words';

export interface CommandOutput {
  /** Writes to standard output. */
  out(text: string): void;
  /** Writes to standard error. */
  err(text: string): void;
}

const usage = 'Usage: npm run -s check -- FILE… [--json]\nChecks SPICE decks with fact lines: every rule, every state of the drive.\nExit 0: no stop; 1: at least one stop; 2: a file could not be read.\n';

const hasStop = ({ report }: FileCheck): boolean => report.findings.some(({ severity }) => severity === 'stop');

function tell(check: FileCheck, json: boolean, output: CommandOutput): void {
  if (!check.readable) {
    for (const { line, reason } of check.report.errors) output.err(`${check.report.file}${line > 0 ? `:${line}` : ''}: ${reason}\n`);
  }
  if (json) output.out(`${JSON.stringify(check.report)}\n`);
  else if (check.readable) output.out(`${fileWords(check.report)}\n`);
}

/**
 * The file checker: checks files one after another on one warm engine. A file's name is tried from each of `folders` in
 * turn. Answers the exit code.
 */
export async function checkCommand(args: readonly string[], output: CommandOutput, folders: readonly string[] = []): Promise<number> {
  const json = args.includes('--json');
  const files = args.filter((arg) => arg !== '--json');
  const unknown = files.find((arg) => arg.startsWith('--'));
  if (files.length === 0 || unknown !== undefined) {
    output.err(unknown === undefined ? usage : `Unknown option ${unknown}.\n${usage}`);
    return 2;
  }
  const engine = createNodeEngine();
  try {
    let unread = false;
    let stopped = false;
    for (const file of files) {
      const check = await checkFile(file, engine, folders);
      tell(check, json, output);
      unread ||= !check.readable;
      stopped ||= hasStop(check);
    }
    return unread ? 2 : stopped ? 1 : 0;
  } finally {
    await engine.dispose();
  }
}
