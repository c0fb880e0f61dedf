import { fileFromRoot } from './file-from-root.mjs';

const allowed = /^(db\/|tests\/|scripts\/|realtime\/testing\/)|^drizzle\.config\.ts$|\.test\.tsx?$/;
/** What builds or sends SQL. lib/auth/session.ts hands Lucia its adapter. */
const packages = /^(drizzle-orm|mysql2)(\/|$)/;

/** SQL lives in db/: queries read, mutations write. @type {import('eslint').Rule.RuleModule} */
export const sqlInDb = {
  meta: { type: 'problem', schema: [], messages: { wrong: 'SQL lives in db/: put a query in db/queries/ or a mutation in db/mutations/ and call that.' } },
  create(context) {
    if (allowed.test(fileFromRoot(context))) return {};
    return {
      ImportDeclaration(node) {
        const forTypes = 'importKind' in node && node.importKind === 'type';
        if (packages.test(String(node.source.value)) && !forTypes) context.report({ node, messageId: 'wrong' });
      },
      ImportExpression(node) {
        if (node.source.type === 'Literal' && packages.test(String(node.source.value))) context.report({ node, messageId: 'wrong' });
      },
    };
  },
};
