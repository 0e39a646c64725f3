import type { Rule, Scope } from 'eslint';

type Node = Rule.Node;

function definitionOf(name: string, scope: Scope.Scope): Scope.Definition | undefined {
  for (let at: Scope.Scope | null = scope; at; at = at.upper) {
    const found = at.set.get(name)?.defs[0];
    if (found) return found;
  }
  return undefined;
}

function initialiser(name: string, scope: Scope.Scope): Node | undefined {
  const found = definitionOf(name, scope);
  return found?.type === 'Variable' ? ((found.node as { init?: Node | null }).init ?? undefined) : undefined;
}

/** Follows a name to what it was declared as in this file; a parameter or an import stays itself. */
export function declaredAs(node: Node, scope: Scope.Scope): Node {
  return (node.type === 'Identifier' ? initialiser(node.name, scope) : undefined) ?? node;
}

/** Whether a name, or the object a property is read from, comes from another file: no request has a hand in that. */
export function isImported(node: Node, scope: Scope.Scope): boolean {
  if (node.type === 'MemberExpression') return !node.computed && isImported(node.object as Node, scope);
  return node.type === 'Identifier' && definitionOf(node.name, scope)?.type === 'ImportBinding';
}
