import { describe, expect, it } from 'vitest';
import { withoutScripts } from './without-scripts';

const page = '<html><head><link rel="stylesheet" href="/a.css"/><link rel="preload" as="script" href="/a.js"/></head><body><h1>Hello</h1><script src="/a.js" async=""></script><script>self.__next_f=[]</script></body></html>';

describe('withoutScripts', () => {
  it('keeps markup and styles and drops every script and its preload', () => {
    const bare = withoutScripts(page, 'own()', 'n1');
    expect(bare).toContain('<h1>Hello</h1>');
    expect(bare).toContain('/a.css');
    expect(bare).not.toContain('/a.js');
    expect(bare).not.toContain('__next_f');
  });

  it('puts its own script last, with the nonce', () => {
    expect(withoutScripts(page, 'own()', 'n1')).toContain('<script nonce="n1">own()</script></body>');
  });
});
