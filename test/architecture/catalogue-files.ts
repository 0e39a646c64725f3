import IntlMessageFormat from 'intl-messageformat';
import * as path from 'node:path';
import * as ts from 'typescript';
import { projectFiles, textOf } from './project-files';

/** Messages by their code. */
export type Catalogue = Readonly<Record<string, string>>;
type MessagePart = ReturnType<IntlMessageFormat['getAst']>[number];

/** How the parser numbers a piece of plain text and the # of a plural. */
const plainText = 0;
const countSign = 7;

/** The files that hold the messages of a language. */
export const wordFiles = projectFiles(['shared/words'], (file) =>
  /^shared\/words\/[a-z]{2}(-[A-Z]{2})?\/[^/]+\.ts$/.test(file),
);

/** The languages there are words in. */
export const languages = [...new Set(wordFiles.map((file) => path.basename(path.dirname(file))))];

/** The codes of one file with their messages, as written. */
function messagesOf(file: string): [string, string][] {
  const found: [string, string][] = [];
  const visit = (node: ts.Node): void => {
    if (ts.isPropertyAssignment(node) && ts.isStringLiteralLike(node.initializer)) {
      found.push([(node.name as ts.StringLiteral | ts.Identifier).text, node.initializer.text]);
    }
    ts.forEachChild(node, visit);
  };
  visit(ts.createSourceFile(file, textOf(file), ts.ScriptTarget.Latest));
  return found;
}

/** The codes of a language with their messages, those given twice too. */
export const entriesOf = (language: string): [string, string][] =>
  wordFiles.filter((file) => file.startsWith(`shared/words/${language}/`)).flatMap(messagesOf);

/** What a language says, by its code. */
export const catalogueOf = (language: string): Catalogue => Object.fromEntries(entriesOf(language));

function valuesIn(parts: readonly MessagePart[]): string[] {
  return parts.flatMap((part): string[] => {
    const kind: number = part.type;
    if (kind === plainText || kind === countSign || !('value' in part)) return [];
    const branches = 'options' in part ? Object.values(part.options) : [];
    return [part.value, ...branches.flatMap(({ value }) => valuesIn(value))];
  });
}

/** The names of the values a message is worded with, those inside its branches too. */
export function valuesOf(message: string): string[] {
  const parts = new IntlMessageFormat(message, 'en', undefined, { ignoreTag: true }).getAst();
  return [...new Set(valuesIn(parts))].sort();
}
