import type { Rule } from 'eslint';

type Node = Rule.Node;
type Operation = Extract<Node, { type: 'BinaryExpression' }>;

const floats = new Set(['parseFloat', 'round', 'floor', 'ceil', 'trunc', 'fround', 'toFixed', 'toPrecision', 'random']);

function nameOf(node: Node): string {
  if (node.type === 'Identifier') return node.name;
  if (node.type === 'MemberExpression') return nameOf(node.property as Node);
  return node.type === 'Literal' && typeof node.value === 'string' ? node.value : '';
}

const isAmount = (node: Node): boolean => nameOf(node).endsWith('_minor');

const isFraction = (node: Node): boolean =>
  node.type === 'Literal' && typeof node.value === 'number' && !Number.isInteger(node.value);

const isFloatCall = (node: Node): boolean => node.type === 'CallExpression' && floats.has(nameOf(node.callee as Node));

const isDivision = (node: Node): boolean => node.type === 'BinaryExpression' && node.operator === '/';

/** A share of one amount in another is a plain number and may be divided; an amount itself may not. */
function leavesMinorUnits({ operator, left, right }: Operation): boolean {
  const [a, b] = [left as Node, right as Node];
  if (operator === '/') return isAmount(a) && !isAmount(b);
  return operator === '*' && ((isAmount(a) && isFraction(b)) || (isFraction(a) && isAmount(b)));
}

/** An amount is whole minor units from end to end: the decimal arithmetic divides, takes shares and rounds it. */
export const wholeMinorUnits: Rule.RuleModule = {
  meta: {
    type: 'problem',
    schema: [],
    messages: {
      fraction: 'An amount in minor units is divided and scaled by the decimal arithmetic, not as a float.',
      float: 'An amount in minor units never comes out of a float: let the decimal arithmetic round it.',
    },
  },
  create(context) {
    const receive = (target: Node, value: Node | null | undefined) => {
      if (value && isAmount(target) && (isFloatCall(value) || isDivision(value)))
        context.report({ node: value, messageId: 'float' });
    };
    return {
      BinaryExpression(node) {
        if (leavesMinorUnits(node)) context.report({ node, messageId: 'fraction' });
      },
      VariableDeclarator: (node) => receive(node.id as Node, node.init as Node | null),
      AssignmentExpression: (node) => receive(node.left as Node, node.right as Node),
      Property: (node) => receive(node.key as Node, node.value as Node),
    };
  },
};
