import type { Rule } from 'eslint';

type Call = Extract<Rule.Node, { type: 'CallExpression' }>;

const testNames = new Set(['it', 'test']);
const expectation = /\b(expect|assert)\w*\s*[(.<]|\btester\.run\(/;

/** `it(…)`, `test(…)`, and their `.each(table)(…)`. */
function isTest({ callee }: Call): boolean {
  if (callee.type === 'Identifier') return testNames.has(callee.name);
  if (callee.type !== 'CallExpression' && callee.type !== 'TaggedTemplateExpression') return false;
  const table = callee.type === 'CallExpression' ? callee.callee : callee.tag;
  return table.type === 'MemberExpression' && table.object.type === 'Identifier' && testNames.has(table.object.name);
}

/** A test that expects nothing passes whatever the code does. */
export const testsExpectSomething: Rule.RuleModule = {
  meta: { type: 'problem', schema: [], messages: { nothing: 'This test expects nothing, so it cannot fail.' } },
  create(context) {
    return {
      CallExpression(node) {
        const body = node.arguments.find(
          ({ type }) => type === 'ArrowFunctionExpression' || type === 'FunctionExpression',
        );
        if (!body || !isTest(node) || expectation.test(context.sourceCode.getText(body))) return;
        context.report({ node, messageId: 'nothing' });
      },
    };
  },
};
