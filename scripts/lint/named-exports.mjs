import { fileFromRoot } from './file-from-root.mjs';

const nextWantsDefault = /^app\/(.*\/)?(page|layout|template|loading|error|global-error|not-found|default|opengraph-image|icon|sitemap|robots|manifest)\.tsx?$|^[^/]+\.config\.(mjs|mts|ts)$|^tests\/support\/[^/]+\.ts$|\.d\.ts$/;

/** Default exports only where Next (or a tool's configuration) demands them: a name is found by searching for it. @type {import('eslint').Rule.RuleModule} */
export const namedExports = {
  meta: { type: 'suggestion', schema: [], messages: { wrong: 'Export by name; a default export is for files whose name Next prescribes.', barrel: 'No barrels: import from the file that defines it.' } },
  create(context) {
    const file = fileFromRoot(context);
    return {
      ExportDefaultDeclaration(node) {
        if (!nextWantsDefault.test(file)) context.report({ node, messageId: 'wrong' });
      },
      ExportAllDeclaration(node) {
        context.report({ node, messageId: 'barrel' });
      },
    };
  },
};
