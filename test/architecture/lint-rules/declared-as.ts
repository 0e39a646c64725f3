import type { Rule, Scope } from 'eslint';

type Node = Rule.Node;

function initialiser(name: string, scope: Scope.Scope): Node | undefined {
  for (let at: Scope.Scope | null = scope; at; at = at.upper) {
    const found = at.set.get(name)?.defs[0];
    if (found)
      return found.type === 'Variable' ? ((found.node as { init?: Node | null }).init ?? undefined) : undefined;
  }
  return undefined;
}

/** Follows a name to what it was declared as in this file; a parameter or an import stays itself. */
export function declaredAs(node: Node, scope: Scope.Scope): Node {
  return (node.type === 'Identifier' ? initialiser(node.name, scope) : undefined) ?? node;
}
