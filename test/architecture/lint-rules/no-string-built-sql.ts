import type { Rule, Scope } from 'eslint';
import { declaredAs, isImported } from './declared-as';

type Node = Rule.Node;
type Call = Extract<Node, { type: 'CallExpression' }>;

/** Methods that take SQL as text, in Sequelize, in the driver and in an options object. */
const takers = new Set(['query', 'literal', 'execute', 'batch']);
const optionNames = new Set(['query', 'sql']);
const joiners = new Set(['concat', 'join', 'replace', 'replaceAll', 'padEnd', 'padStart']);

/** SQL is written with capital verbs here, so a sentence that begins with "Update" or "Select" is not taken for it. */
const beginsLikeSql =
  /^\s*(SELECT|INSERT|REPLACE|UPDATE|DELETE|CREATE|ALTER|DROP|TRUNCATE|GRANT|CALL|SHOW|LOCK|WITH|SET)\s/;

/** Whether a text stands written in this file or an imported one, whatever happens at run time. */
function isWritten(node: Node, scope: Scope.Scope): boolean {
  const text = declaredAs(node, scope);
  if (text.type === 'Literal' || isImported(text, scope)) return true;
  if (text.type === 'TemplateLiteral') return (text.expressions as Node[]).every((part) => isWritten(part, scope));
  if (text.type === 'BinaryExpression')
    return isWritten(text.left as Node, scope) && isWritten(text.right as Node, scope);
  if (text.type === 'ConditionalExpression')
    return isWritten(text.consequent as Node, scope) && isWritten(text.alternate as Node, scope);
  return false;
}

function isJoined(node: Node): boolean {
  if (node.type !== 'CallExpression' || node.callee.type !== 'MemberExpression') return false;
  const { property } = node.callee;
  return property.type === 'Identifier' && joiners.has(property.name);
}

/** The texts behind a node that are put together from parts that only the run knows. */
function builtTexts(node: Node, scope: Scope.Scope): Node[] {
  const text = declaredAs(node, scope);
  if (text.type === 'ConditionalExpression')
    return [text.consequent, text.alternate].flatMap((branch) => builtTexts(branch as Node, scope));
  const isPutTogether = text.type === 'TemplateLiteral' || (text.type === 'BinaryExpression' && text.operator === '+');
  return isJoined(text) || (isPutTogether && !isWritten(text, scope)) ? [text] : [];
}

function sqlOptions(node: Node): Node[] {
  if (node.type !== 'ObjectExpression') return [node];
  return node.properties.flatMap((property) =>
    property.type === 'Property' && property.key.type === 'Identifier' && optionNames.has(property.key.name)
      ? [property.value as Node]
      : [],
  );
}

function takesSql(call: Call): boolean {
  const { callee } = call;
  if (callee.type === 'Identifier') return takers.has(callee.name);
  return (
    callee.type === 'MemberExpression' && callee.property.type === 'Identifier' && takers.has(callee.property.name)
  );
}

function firstWords(node: Node): string {
  if (node.type === 'TemplateLiteral') return node.quasis[0]?.value.raw ?? '';
  if (node.type === 'BinaryExpression') return firstWords(node.left as Node);
  return node.type === 'Literal' && typeof node.value === 'string' ? node.value : '';
}

/** SQL is written whole, with named replacements for what a request brings: nothing is ever pasted into it. */
export const noStringBuiltSql: Rule.RuleModule = {
  meta: {
    type: 'problem',
    schema: [],
    messages: { built: 'SQL is written whole: hand values over as replacements, never paste them into the text.' },
  },
  create(context) {
    const reported = new Set<Node>();
    const complain = (text: Node) => {
      for (const node of builtTexts(text, context.sourceCode.getScope(text))) {
        if (!reported.has(node)) context.report({ node, messageId: 'built' });
        reported.add(node);
      }
    };
    const complainOfSql = (text: Node) => {
      if (beginsLikeSql.test(firstWords(text))) complain(text);
    };
    return {
      CallExpression(node) {
        const [first] = node.arguments as Node[];
        if (first && takesSql(node)) sqlOptions(first).forEach(complain);
      },
      TemplateLiteral: complainOfSql,
      BinaryExpression(node) {
        if (node.operator === '+' && node.parent.type !== 'BinaryExpression') complainOfSql(node);
      },
    };
  },
};
