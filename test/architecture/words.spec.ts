import * as ts from 'typescript';
import { catalogueOf, entriesOf, languages, valuesOf, wordFiles, type Catalogue } from './catalogue-files';
import { isSpec, isTypeScript, projectFiles, textOf } from './project-files';

/** A text written somewhere: whole, or with parts that only the run knows. */
interface Mention {
  readonly whole?: string;
  readonly pattern?: RegExp;
}

const escaped = (text: string): string => text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');

function mentionIn(node: ts.Node): Mention | undefined {
  if (ts.isStringLiteralLike(node)) return { whole: node.text };
  if (ts.isIdentifier(node) && ts.isPropertyAssignment(node.parent)) return { whole: node.text };
  if (!ts.isTemplateExpression(node)) return undefined;
  const parts = [node.head.text, ...node.templateSpans.map(({ literal }) => literal.text)];
  if (parts.join('').replace(/[^a-z]/g, '').length < 4) return undefined;
  return { pattern: new RegExp(`^${parts.map(escaped).join('[a-z0-9-]+')}$`) };
}

function mentionsOf(file: string): Mention[] {
  const found: Mention[] = [];
  const visit = (node: ts.Node): void => {
    const mention = mentionIn(node);
    if (mention) found.push(mention);
    ts.forEachChild(node, visit);
  };
  visit(ts.createSourceFile(file, textOf(file), ts.ScriptTarget.Latest, true));
  return found;
}

function unusedCodes(codes: readonly string[], files: readonly string[]): string[] {
  const mentions = files.flatMap(mentionsOf);
  const whole = new Set(mentions.map((mention) => mention.whole));
  const patterns = mentions.flatMap(({ pattern }) => pattern ?? []);
  return codes.filter((code) => !whole.has(code) && !patterns.some((pattern) => pattern.test(code)));
}

function unreadable([code, message]: [string, string]): string[] {
  try {
    return valuesOf(message).every((name) => /^[a-z][A-Za-z0-9]*(_[a-zµ0-9]+)?$/.test(name)) ? [] : [code];
  } catch {
    return [code];
  }
}

describe('The words', () => {
  const english = catalogueOf('en');
  const users = projectFiles(
    ['shared', 'backend', 'frontend/src', 'seeders'],
    (file) => isTypeScript(file) && !isSpec(file),
  );

  it('are there in English', () => {
    expect(languages).toContain('en');
    expect(Object.keys(english).length).toBeGreaterThan(0);
  });

  it('have a code each', () => {
    const codes = entriesOf('en').map(([code]) => code);
    expect(codes.filter((code, index) => codes.indexOf(code) !== index)).toEqual([]);
  });

  it('have codes in kebab-case', () => {
    expect(Object.keys(english).filter((code) => !/^[a-z0-9]+(-[a-z0-9]+)*$/.test(code))).toEqual([]);
  });

  it('can all be formatted', () => {
    expect(entriesOf('en').flatMap(unreadable)).toEqual([]);
  });

  it('are all said somewhere', () => {
    const sayers = users.filter((file) => !wordFiles.includes(file));
    expect(unusedCodes(Object.keys(english), sayers)).toEqual([]);
  });

  it('are the same codes, with the same values, in every language', () => {
    const shape = (catalogue: Catalogue) =>
      Object.fromEntries(Object.entries(catalogue).map(([code, message]) => [code, valuesOf(message)]));
    expect(languages.map((language) => shape(catalogueOf(language)))).toEqual(languages.map(() => shape(english)));
  });
});

describe('The check of words', () => {
  const here = ['test/architecture/words.spec.ts'];

  it('finds a code nobody says', () => {
    const nobodys = ['a', 'code', 'of', 'nobody'].join('-');
    expect(unusedCodes([nobodys], here)).toEqual([nobodys]);
  });

  it('finds a code said whole, and one said by its beginning', () => {
    const said = (kind: string) => ['said-whole', `said-by-beginning-${kind}`];
    expect(unusedCodes(said('lost'), here)).toEqual([]);
  });

  it('finds the values of a message, inside its branches too', () => {
    expect(valuesOf('{count, plural, one {# leaf of {metal}} other {# leaves}} on {area_mm2}')).toEqual([
      'area_mm2',
      'count',
      'metal',
    ]);
  });

  it('finds a message that cannot be formatted', () => {
    expect(
      unreadable(['broken', 'for {count, plural, one {leaf']).concat(unreadable(['whole', 'for {count}'])),
    ).toEqual(['broken']);
  });
});
