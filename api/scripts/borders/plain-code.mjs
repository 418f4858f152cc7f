import ts from 'typescript';
import { eachNode, isTest, isTypeScript, lineOf } from './source-files.mjs';

/** The command of the migration tool reads its configuration from a default export. */
const MAY_EXPORT_DEFAULT = /^api\/src\/mikro-orm\.config\.ts$|\.config\.ts$/;
/** One line may be excused with its rule and its reason: `eslint-disable-next-line rule -- reason`. */
const SILENCED = /@ts-(ignore|nocheck|expect-error)|eslint-disable(?!-next-line \S+ -- \S)/;
const LEFT_UNDONE = new RegExp(`\\b(${['TO' + 'DO', 'FIX' + 'ME', 'HA' + 'CK'].join('|')})\\b`);

export const noAny = rule(
  '`any` switches the checks off for all that it touches: say the type, or `unknown`',
  (node) => (node.kind === ts.SyntaxKind.AnyKeyword ? 'any' : null),
);

export const namedExports = rule('exports have names, so that one name finds every use', (node, file) => {
  const isDefault = ts.isExportAssignment(node) || node.kind === ts.SyntaxKind.DefaultKeyword;
  return isDefault && !ts.isDefaultClause(node.parent) && !MAY_EXPORT_DEFAULT.test(file.path)
    ? 'export default'
    : null;
});

export const noSkippedTests = rule(
  'a test that does not run shows nothing: no skip, only or todo',
  (node, file) => {
    if (!ts.isCallExpression(node) || !isTestFile(file)) return null;
    const name = node.expression.getText();
    return /^(describe|it|test)\.(skip|only|todo|skipIf|runIf|failing|fails)\b|^(xit|xtest|xdescribe|fit|fdescribe)$/.test(
      name,
    )
      ? name
      : null;
  },
);

export const noSilencedChecks = linesRule(
  'a check is mended, not silenced (a single line may be excused: eslint-disable-next-line rule -- reason)',
  SILENCED,
);
export const nothingLeftUndone = linesRule(
  'what is left to do is written down where work is planned, not in the code',
  LEFT_UNDONE,
);

function isTestFile(file) {
  return isTest(file) || /\.test\./.test(file.path);
}

/** A rule over the nodes of all TypeScript: `find` names a breach or returns null. */
function rule(why, find) {
  return {
    why,
    breaches(files) {
      return files.filter(isTypeScript).flatMap((file) => {
        const found = [];
        eachNode(file, (node) => {
          const breach = find(node, file);
          if (breach) found.push(`${file.path}:${lineOf(file, node)} has ${breach}`);
        });
        return found;
      });
    },
  };
}

function linesRule(why, pattern) {
  return {
    why,
    breaches(files) {
      return files.filter(isTypeScript).flatMap(({ path, text }) =>
        text.split('\n').flatMap((line, index) => {
          const hit = pattern.exec(line);
          return hit ? [`${path}:${index + 1} has ${hit[0]}`] : [];
        }),
      );
    },
  };
}
