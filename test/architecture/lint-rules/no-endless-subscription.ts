import type { Rule, Scope } from 'eslint';
import { declaredAs } from './declared-as';

type Node = Rule.Node;

const endings = new Set(['takeUntilDestroyed', 'take', 'first']);

function isCallOf(node: Node, isNamed: (name: string) => boolean): node is Extract<Node, { type: 'CallExpression' }> {
  if (node.type !== 'CallExpression') return false;
  const { callee } = node;
  const name = callee.type === 'MemberExpression' ? callee.property : callee;
  return name.type === 'Identifier' && isNamed(name.name);
}

/** Whether a stream, or the one it is made from, says when it stops. */
function hasEnd(source: Node, scope: Scope.Scope): boolean {
  const stream = declaredAs(source, scope);
  if (!isCallOf(stream, (name) => name === 'pipe') || stream.callee.type !== 'MemberExpression') return false;
  const ends = (stream.arguments as Node[]).some((operator) => isCallOf(operator, (name) => endings.has(name)));
  return ends || hasEnd(stream.callee.object as Node, scope);
}

/** What subscribes also says when it stops, or a closed page would go on working. */
export const noEndlessSubscription: Rule.RuleModule = {
  meta: {
    type: 'problem',
    schema: [],
    messages: {
      endless:
        'A subscription ends by takeUntilDestroyed, take or first in its pipe; for one value, use firstValueFrom.',
    },
  },
  create(context) {
    return {
      'CallExpression[callee.property.name="subscribe"]'(node: Extract<Node, { type: 'CallExpression' }>) {
        if (
          node.callee.type === 'MemberExpression' &&
          !hasEnd(node.callee.object as Node, context.sourceCode.getScope(node))
        ) {
          context.report({ node: node.callee.property, messageId: 'endless' });
        }
      },
    };
  },
};
