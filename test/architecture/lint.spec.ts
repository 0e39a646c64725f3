import { symlinkSync } from 'node:fs';
import * as path from 'node:path';
import { plantedTree, type PlantedFiles } from './planted-tree';
import { projectRoot } from './project-root';
import { runTool } from './run-tool';

/** What ESLint answers of a file. */
interface LintedFile {
  readonly filePath: string;
  readonly messages: readonly { readonly ruleId: string | null }[];
}

/** What the linter that reads types answers. */
interface TypedReport {
  readonly diagnostics: readonly { readonly code: string; readonly filename: string }[];
}

type RulesByFile = ReadonlyMap<string, readonly (string | null)[]>;

interface Breach {
  readonly what: string;
  readonly rule: string;
  readonly at: string;
  readonly text: string;
}

const component = (template: string, metadata = 'changeDetection: ChangeDetectionStrategy.OnPush,') => `
import { ChangeDetectionStrategy, Component } from '@angular/core';
void ChangeDetectionStrategy;
@Component({ selector: 'app-planted', ${metadata} template: \`${template}\` })
export class Planted {}
`;

const lines = (count: number, line: (index: number) => string) =>
  Array.from({ length: count }, (_, index) => line(index)).join('\n');

const longFile = lines(260, (index) => `export const line${index} = ${index};`);
const longFunction = `export function long(): number {\n${lines(45, () => '  Math.abs(1);')}\n  return 1;\n}\n`;
const fourParameters = 'export const area = (a: number, b: number, c: number, d: number): number => a * b * c * d;\n';
const builtSql = `
interface Database { query(sql: string): Promise<unknown> }
export const find = (database: Database, name: string) => database.query(\`SELECT id FROM jobs WHERE name = "\${name}"\`);
`;

const breaches: readonly Breach[] = [
  { what: 'a file of over 250 lines', rule: 'max-lines', at: 'shared/leaf/long-file.ts', text: longFile },
  {
    what: 'a function of over 40 lines',
    rule: 'max-lines-per-function',
    at: 'shared/leaf/long-function.ts',
    text: longFunction,
  },
  { what: 'a fourth parameter', rule: 'max-params', at: 'shared/leaf/four-parameters.ts', text: fourParameters },
  {
    what: 'an enum',
    rule: 'no-restricted-syntax',
    at: 'shared/leaf/metal.ts',
    text: 'export enum Metal { Gold, Silver }\n',
  },
  {
    what: 'a default export',
    rule: 'no-restricted-syntax',
    at: 'backend/src/jobs/job.ts',
    text: 'export default 1;\n',
  },
  {
    what: 'a default export by another name',
    rule: 'no-restricted-syntax',
    at: 'backend/src/jobs/renamed.ts',
    text: 'const job = 1;\nexport { job as default };\n',
  },
  {
    what: 'zod by a named import',
    rule: 'no-restricted-syntax',
    at: 'shared/jobs/job-schema.ts',
    text: "import { z } from 'zod';\nexport const jobSchema = z.string();\n",
  },
  {
    what: 'zod by another entry',
    rule: 'no-restricted-syntax',
    at: 'shared/jobs/mini-schema.ts',
    text: "import * as z from 'zod/mini';\nexport const miniSchema = z.string();\n",
  },
  {
    what: 'the time in shared',
    rule: 'no-restricted-syntax',
    at: 'shared/calendar/now.ts',
    text: 'export const now = () => Date.now();\n',
  },
  {
    what: 'a date of now in shared',
    rule: 'no-restricted-syntax',
    at: 'shared/calendar/day.ts',
    text: 'export const day = () => new Date();\n',
  },
  {
    what: 'chance in shared',
    rule: 'no-restricted-syntax',
    at: 'shared/programme/draw.ts',
    text: 'export const draw = () => Math.random();\n',
  },
  {
    what: 'chance for a secret',
    rule: 'no-restricted-syntax',
    at: 'backend/src/accounts/token.ts',
    text: 'export const token = () => String(Math.random());\n',
  },
  {
    what: 'eval',
    rule: 'no-eval',
    at: 'backend/src/jobs/evaluated.ts',
    text: "export const value: unknown = eval('1');\n",
  },
  {
    what: 'a function made from text',
    rule: 'no-new-func',
    at: 'frontend/src/app/jobs/made.ts',
    text: "export const made: unknown = new Function('return 1');\n",
  },
  {
    what: 'a text set as markup',
    rule: 'no-restricted-syntax',
    at: 'frontend/src/app/jobs/markup.ts',
    text: 'export const show = (element: HTMLElement, name: string) => {\n  element.innerHTML = name;\n};\n',
  },
  {
    what: 'a text written into the document as markup',
    rule: 'no-restricted-syntax',
    at: 'frontend/src/app/jobs/inserted.ts',
    text: "export const show = (list: HTMLElement, name: string) => list.insertAdjacentHTML('beforeend', name);\n",
  },
  {
    what: 'a text declared harmless',
    rule: 'no-restricted-syntax',
    at: 'frontend/src/app/jobs/trusted.ts',
    text: `import type { DomSanitizer } from '@angular/platform-browser';
export const trusted = (sanitizer: DomSanitizer, name: string) => sanitizer.bypassSecurityTrustHtml(name);
`,
  },
  {
    what: 'a text bound as markup',
    rule: 'no-restricted-syntax',
    at: 'frontend/src/app/jobs/bound.html',
    text: '<p [innerHTML]="name"></p>\n',
  },
  {
    what: 'a text bound as markup by its attribute',
    rule: 'no-restricted-syntax',
    at: 'frontend/src/app/jobs/bound-attribute.ts',
    text: component('<iframe title="Paper" i18n-title [attr.srcdoc]="name"></iframe>'),
  },
  {
    what: 'a timer given text',
    rule: 'typescript(no-implied-eval)',
    at: 'frontend/src/app/jobs/timed.ts',
    text: "export const timed = () => setTimeout('alert(1)', 1);\n",
  },
  {
    what: 'a shell',
    rule: 'no-restricted-syntax',
    at: 'backend/src/platform/files/shell.ts',
    text: "import { spawn } from 'node:child_process';\nexport const shell = () => spawn('ls', { shell: true });\n",
  },
  {
    what: 'a command as one text',
    rule: 'no-restricted-syntax',
    at: 'backend/src/platform/files/command.ts',
    text: "import { exec } from 'node:child_process';\nexport const command = (name: string) => exec(name);\n",
  },
  {
    what: 'SQL built from a value',
    rule: 'local/no-string-built-sql',
    at: 'backend/src/jobs/job-repository.ts',
    text: builtSql,
  },
  {
    what: 'an amount as a float',
    rule: 'local/whole-minor-units',
    at: 'shared/money/half.ts',
    text: 'export const half = (price_minor: number): number => price_minor / 2;\n',
  },
  {
    what: 'a subscription without an end',
    rule: 'local/no-endless-subscription',
    at: 'frontend/src/app/jobs/job-store.ts',
    text: "import { interval } from 'rxjs';\nexport const watched = () => interval(1000).subscribe();\n",
  },
  {
    what: 'a page that looks for changes by itself',
    rule: '@angular-eslint/prefer-on-push-component-change-detection',
    at: 'frontend/src/app/jobs/planted.ts',
    text: component('', ''),
  },
  {
    what: 'text without a mark for translation',
    rule: '@angular-eslint/template/i18n',
    at: 'frontend/src/app/jobs/unmarked.ts',
    text: component('<p>Ready to gild</p>'),
  },
  {
    what: 'a spoken attribute without a mark',
    rule: 'local/spoken-attributes-are-marked',
    at: 'frontend/src/app/jobs/unmarked-attribute.ts',
    text: component('<nav aria-label="Places"></nav>'),
  },
  {
    what: 'a style in a template, which the content policy refuses',
    rule: '@angular-eslint/template/no-inline-styles',
    at: 'frontend/src/app/jobs/styled.html',
    text: '<p style="color: red"></p>\n',
  },
  {
    what: 'a structural directive for a branch',
    rule: '@angular-eslint/template/prefer-control-flow',
    at: 'frontend/src/app/jobs/branch.html',
    text: '<p *ngIf="isOpen"></p>\n',
  },
  {
    what: 'a button of no kind',
    rule: '@angular-eslint/template/button-has-type',
    at: 'frontend/src/app/jobs/button.html',
    text: '<button i18n>Issue</button>\n',
  },
  {
    what: 'a promise nobody waits for',
    rule: 'typescript(no-floating-promises)',
    at: 'backend/src/jobs/unwaited.ts',
    text: 'export const unwaited = () => {\n  Promise.resolve(1);\n};\n',
  },
  {
    what: 'a signal that is not called',
    rule: 'typescript(strict-boolean-expressions)',
    at: 'frontend/src/app/jobs/uncalled.ts',
    text: `
import { signal } from '@angular/core';
export class Uncalled {
  readonly isOpen = signal(false);
  label(): string {
    return !this.isOpen ? 'shut' : 'open';
  }
}
`,
  },
  {
    what: 'a value of another type',
    rule: 'typescript(TS2322)',
    at: 'backend/src/jobs/other-type.ts',
    text: "export const count: number = 'three';\n",
  },
  {
    what: 'a type imported as if it were code',
    rule: '@typescript-eslint/consistent-type-imports',
    at: 'backend/src/jobs/typed.ts',
    text: "import { ServerResponse } from 'node:http';\nexport type Typed = ServerResponse;\n",
  },
  {
    what: 'a test that expects nothing',
    rule: 'local/tests-expect-something',
    at: 'shared/leaf/nothing.spec.ts',
    text: "it('adds', () => {\n  Math.abs(1);\n});\n",
  },
  {
    what: 'an expectation without a matcher',
    rule: 'no-restricted-syntax',
    at: 'shared/leaf/matcherless.spec.ts',
    text: "it('adds', () => {\n  expect(Math.abs(1));\n});\n",
  },
];

/** What is long or handy by nature, and may be so. */
const lawful: PlantedFiles = {
  'shared/leaf/long.spec.ts': `${longFile}\nit('counts', () => {\n  expect(line1).toBe(1);\n});\n`,
  'shared/words/en/leaf.ts': longFile,
  'backend/migrations/0001-jobs.ts': longFile,
  'shared/leaf/leaf-schema.ts': "import * as z from 'zod';\nexport const leafSchema = z.string();\n",
  'frontend/src/app/jobs/marked.ts': component(
    '<nav aria-label="Places" i18n-aria-label><p i18n>Ready to gild</p></nav>',
  ),
  'frontend/src/app/jobs/job-client.ts':
    "import { interval, take } from 'rxjs';\nexport const once = () => interval(1000).pipe(take(1)).subscribe();\n",
};

const copied = [
  '.oxlintrc.json',
  'eslint.config.mjs',
  'package.json',
  'tsconfig.json',
  'backend/tsconfig.json',
  'shared/tsconfig.json',
  'frontend/tsconfig.spec.json',
  'frontend/tsconfig.worker.json',
  'test/architecture/lint-rules',
];

/** The rules each of the files broke, by the linter that reads syntax and the one that reads types. */
function broken(folder: string, files: readonly string[]): RulesByFile {
  const byFile = new Map<string, (string | null)[]>(files.map((file) => [file, []]));
  const linted = runTool('eslint/bin/eslint.js', ['--format', 'json', ...files], folder) as readonly LintedFile[];
  for (const { filePath, messages } of linted)
    byFile.get(path.relative(folder, filePath))?.push(...messages.map(({ ruleId }) => ruleId));
  const byTypes = ['--type-aware', '--type-check', '--format', 'json', ...files];
  const typed = runTool('oxlint/bin/oxlint', byTypes, folder) as TypedReport;
  for (const { code, filename } of typed.diagnostics) byFile.get(filename)?.push(code);
  return byFile;
}

function linted(): RulesByFile {
  const unlawful = Object.fromEntries(breaches.map(({ at, text }) => [at, text]));
  const tree = plantedTree(copied, { ...lawful, ...unlawful });
  try {
    symlinkSync(path.join(projectRoot, 'node_modules'), path.join(tree.folder, 'node_modules'));
    return broken(tree.folder, [...Object.keys(unlawful), ...Object.keys(lawful)]);
  } finally {
    tree.remove();
  }
}

describe('Lint', () => {
  let found: RulesByFile = new Map();

  beforeAll(() => {
    found = linted();
  }, 120_000);

  it.each(breaches.map(({ what, rule, at }) => [what, rule, at]))('refuses %s (%s)', (_what, rule, at) => {
    expect(found.get(at)).toContain(rule);
  });

  it.each(Object.keys(lawful))('leaves %s in peace', (at) => {
    expect(found.get(at)).toEqual([]);
  });
});
