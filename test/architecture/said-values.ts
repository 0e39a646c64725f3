import * as ts from 'typescript';
import { noMeasures } from '#shared/words/say';
import { valuesOf, type Catalogue } from './catalogue-files';

/** A code that is named together with the values it is to be worded with. */
interface Saying {
  readonly code: string;
  readonly given: readonly string[];
  readonly line: number;
}

/** The texts an expression may come to, as far as they stand in it. */
function textsOf(node: ts.Expression | undefined): string[] {
  if (!node) return [];
  if (ts.isStringLiteralLike(node)) return [node.text];
  if (ts.isConditionalExpression(node)) return [...textsOf(node.whenTrue), ...textsOf(node.whenFalse)];
  return ts.isParenthesizedExpression(node) ? textsOf(node.expression) : [];
}

const nameOf = (node: ts.Node | undefined): string | undefined =>
  node && (ts.isIdentifier(node) || ts.isStringLiteralLike(node)) ? node.text : undefined;

/** The names of an object written out; one that takes some from elsewhere has names only the run knows. */
function namesOf(node: ts.Expression | undefined): string[] | undefined {
  if (!node || !ts.isObjectLiteralExpression(node)) return undefined;
  const names = node.properties.map(({ name }) => nameOf(name));
  return names.every((name) => name !== undefined) ? names : undefined;
}

/** Words are said by `say` under whatever object it stands; without a second argument no value is given. */
const isSay = ({ expression }: ts.CallExpression): boolean =>
  nameOf(ts.isPropertyAccessExpression(expression) ? expression.name : expression) === 'say';

function givenTo(call: ts.CallExpression): string[] | undefined {
  return call.arguments.length === 1 && isSay(call) ? [] : namesOf(call.arguments[1]);
}

function entryOf(object: ts.ObjectLiteralExpression, wanted: string): ts.Expression | undefined {
  const found = object.properties.find(({ name }) => nameOf(name) === wanted);
  return found && ts.isPropertyAssignment(found) ? found.initializer : undefined;
}

/** A finding (it has a kind) and a reason (it has a figure) are whole; what else has a code may get more values on its way. */
const isWhole = (object: ts.ObjectLiteralExpression): boolean =>
  object.properties.some(({ name }) => ['kind', 'figure'].includes(nameOf(name) ?? ''));

function saidBy(node: ts.Node): Omit<Saying, 'line'>[] {
  const each = (codes: string[], given: string[] | undefined) => (given ? codes.map((code) => ({ code, given })) : []);
  if (ts.isCallExpression(node)) return each(textsOf(node.arguments[0]), givenTo(node));
  if (!ts.isObjectLiteralExpression(node) || !isWhole(node)) return [];
  return each(textsOf(entryOf(node, 'code')), namesOf(entryOf(node, 'values')));
}

function sayingsIn(text: string): Saying[] {
  const source = ts.createSourceFile('said.ts', text, ts.ScriptTarget.Latest, true);
  const found: Saying[] = [];
  const visit = (node: ts.Node): void => {
    const line = source.getLineAndCharacterOfPosition(node.getStart()).line + 1;
    found.push(...saidBy(node).map((said) => ({ ...said, line })));
    ts.forEachChild(node, visit);
  };
  visit(source);
  return found;
}

/** A message may call `girth_mm` just `girth`: the unit comes with the value. */
const isGiven = (wanted: string, given: readonly string[]): boolean =>
  given.some((name) => name === wanted || name.replace(/_[a-zµ0-9]+$/, '') === wanted);

/** What a text of code says in the words of a catalogue: how often with values that stand beside it, and where one its message names is missing. */
export function saidValues(text: string, catalogue: Catalogue): { count: number; missing: string[] } {
  const said = sayingsIn(text).flatMap((saying) => {
    const message = catalogue[saying.code];
    return message === undefined ? [] : [{ ...saying, wanted: valuesOf(message) }];
  });
  const missing = said.flatMap(({ code, given, line, wanted }) =>
    wanted
      .filter((name) => !(name in noMeasures) && !isGiven(name, given))
      .map((name) => `line ${line}: ${code} lacks ${name}`),
  );
  return { count: said.length, missing };
}
