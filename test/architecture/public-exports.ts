import * as ts from 'typescript';
import { textOf } from './project-files';

/** Something a file exports: its name, whether it is called, and the comment in front of it. */
export interface PublicExport {
  readonly name: string;
  readonly isFunction: boolean;
  readonly comment: string;
}

const isExported = (statement: ts.Statement): boolean =>
  ts.canHaveModifiers(statement) &&
  (ts.getModifiers(statement) ?? []).some(({ kind }) => kind === ts.SyntaxKind.ExportKeyword);

function commentOf(statement: ts.Statement): string {
  const comments = ts.getJSDocCommentsAndTags(statement).filter(ts.isJSDoc);
  return comments.map(({ comment }) => ts.getTextOfJSDocComment(comment) ?? '').join(' ');
}

function declared(statement: ts.Statement): { name: string; isFunction: boolean }[] {
  if (ts.isVariableStatement(statement)) {
    return statement.declarationList.declarations.map(({ name, initializer }) => ({
      name: name.getText(),
      isFunction: initializer !== undefined && ts.isArrowFunction(initializer),
    }));
  }
  const name = (statement as ts.Statement & { readonly name?: ts.Identifier }).name?.text;
  return name === undefined ? [] : [{ name, isFunction: ts.isFunctionDeclaration(statement) }];
}

function passedOn(statement: ts.Statement): { name: string; isFunction: boolean }[] {
  if (!ts.isExportDeclaration(statement) || !statement.exportClause || !ts.isNamedExports(statement.exportClause))
    return [];
  return statement.exportClause.elements.map(({ name }) => ({ name: name.text, isFunction: false }));
}

/** What a file of the project exports, in the order of its text. */
export function publicExports(file: string): PublicExport[] {
  const source = ts.createSourceFile(file, textOf(file), ts.ScriptTarget.Latest, true);
  return source.statements.flatMap((statement) =>
    (isExported(statement) ? declared(statement) : passedOn(statement)).map((found) => ({
      ...found,
      comment: commentOf(statement),
    })),
  );
}
