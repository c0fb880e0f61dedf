import { spawn } from 'node:child_process';

/** A server in a process of its own that prints something once it listens; ends when its pipe closes. */
export async function childServer(args: readonly string[], env: Readonly<Record<string, string>> = {}): Promise<{ readonly firstLine: string; readonly stop: () => Promise<void> }> {
  const child = spawn(process.execPath, [...args], { stdio: ['pipe', 'pipe', 'inherit'], env: { ...process.env, ...env } });
  const exited = new Promise<void>((resolve) => child.once('exit', () => resolve()));
  const firstLine = await new Promise<string>((resolve, reject) => {
    child.stdout.once('data', (bytes: Buffer) => resolve(bytes.toString().split('\n')[0] ?? ''));
    child.once('exit', (code) => reject(new Error(`${args.join(' ')} ended with ${code}`)));
  });
  return {
    firstLine,
    stop: async () => {
      child.stdin.end();
      child.kill('SIGTERM');
      await exited;
    },
  };
}
