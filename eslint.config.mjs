import eslint from '@eslint/js';
import angular from 'angular-eslint';
import prettier from 'eslint-config-prettier';
import { defineConfig, globalIgnores } from 'eslint/config';
import { createHash } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import tseslint from 'typescript-eslint';
import { tsImport } from 'tsx/esm/api';

const rulesFolder = new URL('./test/architecture/lint-rules/', import.meta.url);
const { localRules } = await tsImport('./local-rules.ts', rulesFolder.href);

/** Changes with the text of the local rules, so that the cache does not answer for older ones. */
const rulesVersion = readdirSync(rulesFolder)
  .reduce((hash, name) => hash.update(readFileSync(new URL(name, rulesFolder))), createHash('sha256'))
  .digest('hex');

const local = { meta: { name: 'local', version: rulesVersion }, rules: localRules };

const specs = ['**/*.spec.ts'];
const typescript = ['**/*.ts'];
const configuration = ['*.{mjs,cjs}', '**/*.{mjs,cjs,js}'];

/** Data that is long by nature and has no decisions in it. */
const startData = ['backend/**/migrations/**', 'shared/words/*/*.ts', '**/start-*.ts', '**/*-start.ts', 'seeders/**'];

const refuse = (selector, message) => ({ selector, message });

const everywhereRefused = [
  refuse('TSEnumDeclaration', 'Use a union of strings, or a const object: enums are neither type nor plain value.'),
  refuse('ExportDefaultDeclaration, ExportSpecifier[exported.name="default"]', 'Export it by its name.'),
  refuse(
    'ImportDeclaration[source.value="zod"] > :matches(ImportSpecifier, ImportDefaultSpecifier)',
    "Write `import * as z from 'zod'`: the named import carries every language's messages to the browser.",
  ),
  refuse('ImportDeclaration[source.value=/^zod.(?!v4.core$)/]', "Write `import * as z from 'zod'`."),
  refuse(
    'MemberExpression[object.name="Math"][property.name="random"]',
    'Chance is a seed given as an argument; secrets come from node:crypto.',
  ),
  refuse(
    'Property[key.name="shell"]:not([value.value=false])',
    'A command is started with its arguments, never through a shell.',
  ),
  refuse(
    'ImportDeclaration[source.value=/^(node:)?child_process$/] > ImportSpecifier[imported.name=/^exec(Sync)?$/]',
    'A command is started by spawn or execFile with its arguments, never through a shell.',
  ),
];

const sharedRefused = [
  ...everywhereRefused,
  refuse('MemberExpression[object.name="Date"][property.name="now"]', 'The time is an argument.'),
  refuse(':matches(NewExpression, CallExpression)[callee.name="Date"][arguments.length=0]', 'The time is an argument.'),
];

const asText = 'A text is inserted as text, never as markup.';

const pageRefused = [
  ...everywhereRefused,
  refuse('AssignmentExpression > MemberExpression.left[property.name=/^(innerHTML|outerHTML|srcdoc)$/]', asText),
  refuse(
    'CallExpression[callee.property.name=/^(insertAdjacentHTML|setHTMLUnsafe|parseHTMLUnsafe|createContextualFragment|parseFromString)$/]',
    asText,
  ),
  refuse('CallExpression[callee.object.name="document"][callee.property.name=/^write(ln)?$/]', asText),
  refuse('CallExpression[callee.property.name=/^bypassSecurityTrust/]', asText),
];

const templatesRefused = [
  refuse(':matches(BoundAttribute, TextAttribute)[name=/^(innerHTML|outerHTML|srcdoc)$/i]', asText),
];

const specsRefused = [
  ...everywhereRefused,
  refuse('ExpressionStatement > CallExpression[callee.name="expect"]', 'An expectation needs a matcher.'),
];

const restrictedSyntax = (refused) => ({ 'no-restricted-syntax': ['error', ...refused] });

const limits = {
  'max-lines': ['error', { max: 250 }],
  'max-lines-per-function': ['error', { max: 40 }],
  'max-params': ['error', { max: 3 }],
};

const withoutLimits = Object.fromEntries(Object.keys(limits).map((name) => [name, 'off']));

const always = {
  files: typescript,
  plugins: { local },
  rules: {
    ...limits,
    ...restrictedSyntax(everywhereRefused),
    eqeqeq: 'error',
    'no-eval': 'error',
    'no-new-func': 'error',
    'no-console': 'error',
    'no-alert': 'error',
    /** Texts refuse control characters by naming them. */
    'no-control-regex': 'off',
    'local/no-string-built-sql': 'error',
    'local/whole-minor-units': 'error',
    '@typescript-eslint/consistent-type-imports': 'error',
    '@typescript-eslint/no-unused-vars': ['error', { ignoreRestSiblings: true }],
  },
};

const sharedOnly = {
  files: ['shared/**/*.ts'],
  ignores: specs,
  rules: {
    ...restrictedSyntax(sharedRefused),
    'no-restricted-globals': ['error', 'performance', 'crypto', 'fetch', 'process', 'setTimeout', 'setInterval'],
  },
};

const page = {
  files: ['frontend/**/*.ts'],
  extends: [...angular.configs.tsRecommended],
  processor: angular.processInlineTemplates,
  rules: {
    ...restrictedSyntax(pageRefused),
    'local/no-endless-subscription': 'error',
    'no-console': ['error', { allow: ['error'] }],
    '@angular-eslint/prefer-on-push-component-change-detection': 'error',
    '@angular-eslint/prefer-signals': 'error',
    '@angular-eslint/prefer-output-readonly': 'error',
    '@angular-eslint/component-class-suffix': 'off',
    '@angular-eslint/directive-class-suffix': 'off',
    '@angular-eslint/component-selector': ['error', { type: 'element', prefix: 'app', style: 'kebab-case' }],
    '@angular-eslint/directive-selector': ['error', { type: 'attribute', prefix: 'app', style: 'camelCase' }],
    /** An empty class is what a component with all in its template is. */
    '@typescript-eslint/no-extraneous-class': ['error', { allowWithDecorator: true }],
  },
};

const templates = {
  files: ['frontend/**/*.html'],
  ignores: ['frontend/src/index.html', 'frontend/src/client.html'],
  plugins: { local },
  extends: [...angular.configs.templateRecommended, ...angular.configs.templateAccessibility],
  rules: {
    '@angular-eslint/template/prefer-control-flow': 'error',
    '@angular-eslint/template/button-has-type': 'error',
    '@angular-eslint/template/no-inline-styles': ['error', { allowNgStyle: true, allowBindToStyle: true }],
    '@angular-eslint/template/no-any': 'error',
    ...restrictedSyntax(templatesRefused),
    '@angular-eslint/template/i18n': ['error', { checkId: false, checkDuplicateId: false, checkAttributes: false }],
    'local/spoken-attributes-are-marked': 'error',
  },
};

/** Express and Passport ask for callbacks of four parameters; nobody else does. */
const callbacksOfFour = {
  files: ['backend/src/platform/{http,session}/**/*.ts'],
  rules: { 'max-params': ['error', { max: 4 }] },
};

/** Drawn costs are floats until their percentile is settled. */
const riskIsDrawn = { files: ['shared/**/risk*.ts'], rules: { 'local/whole-minor-units': 'off' } };

const inSpecs = {
  files: specs,
  rules: {
    ...withoutLimits,
    ...restrictedSyntax(specsRefused),
    'local/tests-expect-something': 'error',
    '@typescript-eslint/no-non-null-assertion': 'off',
    'local/no-endless-subscription': 'off',
    'local/whole-minor-units': 'off',
  },
};

const scripts = {
  files: configuration,
  languageOptions: {
    globals: Object.fromEntries(
      ['process', 'console', 'URL', 'setTimeout', 'clearTimeout', 'fetch', 'Buffer'].map((name) => [name, 'readonly']),
    ),
  },
  rules: { ...limits, eqeqeq: 'error', 'no-eval': 'error' },
};

const commonJs = {
  files: ['**/*.cjs'],
  languageOptions: {
    sourceType: 'commonjs',
    globals: { require: 'readonly', module: 'writable', exports: 'writable', __dirname: 'readonly' },
  },
  rules: { '@typescript-eslint/no-require-imports': 'off' },
};

export default defineConfig(
  globalIgnores(['dist/**', '.angular/**', '.cache/**', 'data/**', 'coverage/**', 'fonts/**', 'frontend/public/**']),
  { linterOptions: { reportUnusedDisableDirectives: 'error' } },
  { files: [...typescript, ...configuration], extends: [eslint.configs.recommended] },
  { files: typescript, extends: [...tseslint.configs.recommended] },
  always,
  sharedOnly,
  page,
  templates,
  callbacksOfFour,
  riskIsDrawn,
  inSpecs,
  { files: startData, rules: withoutLimits },
  { files: ['test/**/*.ts'], rules: { 'no-console': 'off' } },
  scripts,
  commonJs,
  prettier,
);
