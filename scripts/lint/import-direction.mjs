import { builtinModules } from 'node:module';
import path from 'node:path';
import { fileFromRoot } from './file-from-root.mjs';
import { importRefusal, packageRefusal } from './layers.mjs';

/** No import runs upward; the message names where the code belongs. `lib/netlist` uses relative paths, so that it could stand alone. @type {import('eslint').Rule.RuleModule} */
export const importDirection = {
  meta: { type: 'problem', schema: [], messages: { wrong: '{{reason}}' } },
  create(context) {
    const from = fileFromRoot(context);
    const check = (/** @type {any} */ node) => {
      const name = node.source?.value;
      if (typeof name !== 'string') return;
      const reason = refusal(from, name);
      if (reason) context.report({ node: node.source, messageId: 'wrong', data: { reason } });
    };
    return { ImportDeclaration: check, ExportNamedDeclaration: check, ExportAllDeclaration: check, ImportExpression: check };
  },
};

/** @param {string} from @param {string} name */
function refusal(from, name) {
  if (name.startsWith('.')) return importRefusal(from, path.posix.normalize(path.posix.join(path.posix.dirname(from), name)));
  if (name.startsWith('@/')) {
    if (from.startsWith('lib/netlist/')) return 'lib/netlist/ uses relative imports, so that it could stand alone.';
    return importRefusal(from, name.slice(2));
  }
  if (name.startsWith('node:') || builtinModules.includes(name)) {
    return packageRefusal(from, name.startsWith('node:') ? name : `node:${name}`);
  }
  return packageRefusal(from, name);
}
