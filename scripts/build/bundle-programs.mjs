import { readdirSync } from 'node:fs';
import path from 'node:path';

/**
 * Bundles the programs that run beside web: realtime, and what stands in `scripts/programs` (migrations, demo, first steward).
 * Packages stay outside and are found in node_modules.
 * @param {string} root
 * @param {string} folder where the `.mjs` files go
 */
export async function bundlePrograms(root, folder) {
  const { build, stop } = await import('esbuild');
  const programs = readdirSync(path.join(root, 'scripts/programs')).filter((name) => name.endsWith('.ts') && !name.endsWith('.test.ts'));
  await build({
    absWorkingDir: root,
    entryPoints: {
      realtime: 'realtime/server/main.ts',
      ...Object.fromEntries(programs.map((name) => [name.replace(/\.ts$/, ''), `scripts/programs/${name}`])),
    },
    outdir: folder,
    outExtension: { '.js': '.mjs' },
    bundle: true,
    platform: 'node',
    target: 'node20',
    format: 'esm',
    packages: 'external',
    sourcemap: 'linked',
    logLevel: 'warning',
  });
  // Its helper process would stay for as long as this one.
  await stop();
}
