import { existsSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { environmentSchema } from '@/lib/env/schema';
import { layers } from '../../scripts/lint/layers.mjs';
import { root, textOf } from './tracked-files';

const readme = textOf('README.md');
const developers = textOf('DEVELOPERS.md');
const scripts = Object.keys((JSON.parse(textOf('package.json')) as { scripts: Record<string, string> }).scripts);

describe('README.md', () => {
  it('names every variable that the product reads', () => {
    const internal = ['NODE_ENV', 'LOCAL_MAILBOX'];
    const missing = Object.keys(environmentSchema.shape).filter((name) => !internal.includes(name) && !readme.includes(`\`${name}\``));
    expect(missing).toEqual([]);
  });

  it('shows a picture that is there', () => {
    const pictures = [...readme.matchAll(/!\[[^\]]+\]\(([^)]+)\)/g)].map(([, file = '']) => file);
    expect(pictures.length).toBeGreaterThan(0);
    expect(pictures.filter((file) => !existsSync(path.join(root, file)))).toEqual([]);
  });

  it.each(['README.md', 'DEVELOPERS.md'])('%s names commands that exist', (file) => {
    const named = [...textOf(file).matchAll(/npm run (?:-s )?([a-z][a-z:-]*[a-z])/g)].map(([, name = '']) => name);
    expect(named.filter((name) => !scripts.includes(name))).toEqual([]);
  });
});

describe('DEVELOPERS.md', () => {
  it('stays within 200 lines', () => expect(developers.split('\n').length).toBeLessThanOrEqual(200));

  it('names every folder of the ground plan', () => {
    const missing = layers.map(({ folder }) => folder.split('/').slice(0, 2)).filter(([top = '', sub]) => {
      const name = top === 'lib' && sub ? `\`lib/${sub}/\`` : `\`${top}/\``;
      return top !== 'lib' || sub ? !developers.includes(name) : false;
    });
    expect(missing).toEqual([]);
  });

  it('names files that exist', () => {
    const named = [...developers.matchAll(/`((?:app|db|lib|realtime|scripts|tests)\/[^`<>…{}*[\]]+\.(?:ts|tsx|mjs|md))`/g)].map(([, file = '']) => file);
    expect(named.filter((file) => !existsSync(path.join(root, file)))).toEqual([]);
  });
});
