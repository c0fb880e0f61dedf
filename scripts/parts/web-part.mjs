import path from 'node:path';

const endWithParent = new URL('./end-with-parent.mjs', import.meta.url).href;

/**
 * The web process: `next start` on a finished build, or `next dev`.
 * @param {{ root: string, host: string, port: number, env: NodeJS.ProcessEnv, logFile: string, dev: boolean }} input
 * @returns {import('./part.mjs').PartPlan}
 */
export function webPart({ root, host, port, env, logFile, dev }) {
  const next = path.join(root, 'node_modules/next/dist/bin/next');
  return {
    name: 'Web',
    command: process.execPath,
    args: ['--import', endWithParent, next, dev ? 'dev' : 'start', root, '--port', String(port), '--hostname', host],
    env: { ...env, NODE_ENV: dev ? 'development' : 'production' },
    cwd: root,
    logFile,
    graceMs: 8_000,
    echo: dev,
    readyMs: 120_000,
    ready: async () => {
      const answer = await fetch(`http://${reachable(host)}:${port}/api/health`, { signal: AbortSignal.timeout(10_000) });
      if (answer.status === 200) return true;
      // Mail and files may still have to be set up; pages and sheets work without them.
      const body = await answer.json();
      return answer.status === 503 && isUp(body.database) && isUp(body.realtime);
    },
  };
}

/** @param {unknown} state a part's state in the answer of `/api/health` */
function isUp(state) {
  return state === 'ok' || (typeof state === 'object' && state !== null && 'state' in state && state.state === 'ok');
}

/** @param {string} host */
export function reachable(host) {
  if (host === '0.0.0.0' || host === '::') return '127.0.0.1';
  return host.includes(':') ? `[${host}]` : host;
}
