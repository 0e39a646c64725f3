import * as path from 'node:path';
import features from '../../shared/features.json';
import { isSpec, isTypeScript, productFiles, projectFiles } from './project-files';
import { publicExports } from './public-exports';

const written = projectFiles(['shared', 'backend', 'frontend/src', 'seeders', 'test'], () => true);

const kebabCase = /^_?[a-z0-9]+(-[a-z0-9]+)*(\.[a-z0-9]+)+$/;
const namesForAnything = /(^|[-/.])(utils?|helpers?|common|types?|managers?|misc|stuff)([-/.]|$)/;

/** Files of equals, where no export is the main one. */
const families = new Set([
  'shared/problems/entry-schema.ts',
  'shared/problems/card-entry-schema.ts',
  'shared/units/exact-factors.ts',
  'shared/accounts/workshop-options.ts',
  'frontend/src/app/client-page/later-pages.ts',
  'frontend/src/app/client-page/later-parts.ts',
]);

/** What an ending promises, and the one side it belongs to. */
const sideOfSuffix = {
  'backend/src': ['routes', 'service', 'policy', 'repository', 'model', 'presenter'],
  'frontend/src/app': ['routes', 'page', 'form', 'store', 'schema'],
  shared: ['schema', 'endpoints'],
} as const;

const suffixes: readonly string[] = [...new Set(Object.values(sideOfSuffix).flat())];

const suffixOf = (file: string): string | undefined => suffixes.find((suffix) => file.endsWith(`-${suffix}.ts`));

/** A word of a file name in the forms an export may say it in. */
const formsOf = (word: string): string[] => [word, word === 'people' ? 'person' : word.replace(/s$/, '')];

/** Whether an identifier bears the name of its file, to which the ending need not belong; a feature may have several routes. */
function bearsNameOf(file: string, identifier: string): boolean {
  const suffix = suffixOf(file);
  const asked = path
    .basename(file, '.ts')
    .split('-')
    .slice(0, suffix ? -1 : undefined);
  const said = identifier.toLowerCase();
  if (suffix === 'routes' && said.endsWith('routes')) return true;
  return asked.every((word) => formsOf(word).some((form) => said.includes(form)));
}

/** Start data of the demonstration is gathered by what it tells. */
const isStartData = (file: string): boolean => file.startsWith('seeders/');

function isNamedAfterItsExport(file: string): boolean {
  if (isStartData(file)) return true;
  const exported = publicExports(file);
  return exported.length === 0 || exported.some(({ name }) => bearsNameOf(file, name));
}

/** Words bear the name of their feature, whatever it ends in. */
const isOfWords = (file: string): boolean => file.startsWith('shared/words/');

function isOnItsSide(file: string): boolean {
  if (isOfWords(file)) return true;
  const suffix = suffixOf(file);
  const side = Object.entries(sideOfSuffix).find(([folder]) =>
    features.some((feature) => file.startsWith(`${folder}/${feature}/`)),
  );
  return suffix === undefined || side === undefined || (side[1] as readonly string[]).includes(suffix);
}

describe('A file', () => {
  it('is named in kebab-case', () => {
    expect(written.map((file) => path.basename(file)).filter((name) => !kebabCase.test(name))).toEqual([]);
  });

  it('is named for what it holds, never for holding anything', () => {
    expect(written.filter((file) => namesForAnything.test(file))).toEqual([]);
  });

  it('bears the name of its main export', () => {
    const named = productFiles().filter((file) => !/\/index\.ts$|\/migrations\//.test(file) && !families.has(file));
    expect(named.filter((file) => !isNamedAfterItsExport(file))).toEqual([]);
  });

  it('has an ending of its own side', () => {
    expect(productFiles().filter((file) => !isOnItsSide(file))).toEqual([]);
  });

  it('of shared is imported itself: there is no index there', () => {
    expect(written.filter((file) => /^shared\/.*\/?index\.ts$/.test(file))).toEqual([]);
  });

  it('of tests stands beside the code it tests, or in test', () => {
    const specs = written.filter((file) => isTypeScript(file) && isSpec(file) && !file.startsWith('test/'));
    const code = new Set(written);
    const alone = specs.filter(
      (spec) => ![...code].some((file) => !isSpec(file) && path.dirname(file) === path.dirname(spec)),
    );
    expect(alone).toEqual([]);
  });
});

describe('The check of names', () => {
  it.each([
    ['shared/leaf/leaf-order.ts', 'leafOrder', true],
    ['shared/leaf/leaf-order.ts', 'LeafOrder', true],
    ['shared/leaf/leaf-order.ts', 'goldOrder', false],
    ['shared/actor/role.ts', 'roles', true],
    ['shared/leaf/leaf-schema.ts', 'leafEntry', true],
    ['shared/buildups/buildup-card.ts', 'BuildUpCard', true],
    ['shared/accounts/people-schema.ts', 'personSchema', true],
    ['shared/accounts/people-endpoints.ts', 'listPeople', true],
    ['backend/src/jobs/job-service.ts', 'JobService', true],
    ['backend/src/jobs/job-service.ts', 'Estimates', false],
    ['backend/src/jobs/job-model.ts', 'jobTable', true],
    ['frontend/src/app/accounts/accounts-routes.ts', 'memberRoutes', true],
    ['frontend/src/app/accounts/accounts-routes.ts', 'members', false],
    ['frontend/src/app/leaf/leaf-page.ts', 'LeafPage', true],
  ])('%s exporting %s: %s', (file, identifier, bears) => {
    expect(bearsNameOf(file, identifier)).toBe(bears);
  });

  it.each([
    ['shared/jobs/job-repository.ts', false],
    ['backend/src/jobs/job-page.ts', false],
    ['frontend/src/app/jobs/job-model.ts', false],
    ['backend/src/jobs/job-repository.ts', true],
    ['backend/src/platform/session/session-store.ts', true],
  ])('%s on its side: %s', (file, isRight) => {
    expect(isOnItsSide(file)).toBe(isRight);
  });

  it.each([
    ['shared/money/utils.ts', true],
    ['backend/src/task-manager/index.ts', true],
    ['shared/leaf/leaf-types.ts', true],
    ['shared/calendar/prototype.ts', false],
  ])('%s named for anything: %s', (file, isNamed) => {
    expect(namesForAnything.test(file)).toBe(isNamed);
  });
});
