import { fileFromRoot } from './file-from-root.mjs';

const allowed = /^(lib\/env\/|scripts\/|tests\/)|^[^/]+\.config\.(mjs|mts|ts)$|\.test\.tsx?$/;

/** `process.env` is read by lib/env, which parses it once. @type {import('eslint').Rule.RuleModule} */
export const environmentOnce = {
  meta: { type: 'problem', schema: [], messages: { wrong: 'Read the environment through environment() of lib/env, which parses it once; add the variable to lib/env/schema.ts.' } },
  create(context) {
    if (allowed.test(fileFromRoot(context))) return {};
    const isProcess = (/** @type {any} */ node) => node.type === 'Identifier' && node.name === 'process';
    return {
      MemberExpression(node) {
        const { property } = node;
        const name = property.type === 'Literal' ? property.value : property.type === 'Identifier' ? property.name : '';
        if (isProcess(node.object) && name === 'env') context.report({ node, messageId: 'wrong' });
      },
      VariableDeclarator(node) {
        if (node.init && isProcess(node.init) && node.id.type === 'ObjectPattern') context.report({ node, messageId: 'wrong' });
      },
      ImportDeclaration(node) {
        if (/^(node:)?process$/.test(String(node.source.value))) context.report({ node, messageId: 'wrong' });
      },
    };
  },
};
