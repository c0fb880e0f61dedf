import { describe, expect, it } from 'vitest';
import { sourceFiles, textOf } from './tracked-files';

const manifest = JSON.parse(textOf('package.json')) as Record<'dependencies' | 'devDependencies', Record<string, string>>;
const exact = /^(npm:@?[a-z0-9./-]+@)?\d+\.\d+\.\d+(-[a-z0-9.]+)?$/;

describe('packages', () => {
  it('have exact versions', () => {
    const all = { ...manifest.dependencies, ...manifest.devDependencies };
    expect(Object.entries(all).filter(([, version]) => !exact.test(version))).toEqual([]);
  });

  it('are locked without the address of any registry', () => {
    expect(textOf('package-lock.json')).not.toMatch(/"resolved":|https?:\/\/[^"]*\.tgz/);
    expect(textOf('.npmrc')).not.toMatch(/registry/);
  });

  it('are used: every one is named somewhere', () => {
    const written = [...sourceFiles(), 'package.json'].map((file) => (file === 'package.json' ? JSON.stringify(JSON.parse(textOf(file)).scripts) : textOf(file))).join('\n');
    // Attachments and outgoing mail come with their screens; the stack that they were proven in is kept together.
    const toolsOnly = /^@types\/|^(typescript|vite|tailwindcss|react-dom|drizzle-kit|yjs|y-protocols|lib0)$/;
    const unused = Object.keys(manifest.dependencies).filter((name) => !toolsOnly.test(name) && !written.includes(name));
    expect(unused).toEqual([]);
  });
});
