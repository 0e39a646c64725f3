import features from '../../shared/features.json';
import { isSpec, projectFiles, textOf } from './project-files';

const folders = ['shared', 'backend', 'frontend', 'seeders', 'test'];
const isCode = (file: string): boolean => /\.(ts|mjs|cjs|html|scss)$/.test(file);
const written = projectFiles(['.'], (file) => /\.(ts|mjs|cjs|js|json|html|scss|md|svg|yml|yaml)$/.test(file));
const code = projectFiles(folders, isCode);
const specs = code.filter(isSpec);

/** Data that is long by nature, and tests. */
const mayBeLong = (file: string): boolean =>
  isSpec(file) || /(^|\/)migrations\/|^shared\/words\/[^/]+\/|(^|\/)start-[^/]+\.ts$|-start\.ts$|^seeders\//.test(file);

/** Each line of these files that fits the pattern, as `file:line`. */
function linesWith(files: readonly string[], pattern: RegExp): string[] {
  return files.flatMap((file) =>
    textOf(file)
      .split('\n')
      .flatMap((line, index) => (pattern.test(line) ? [`${file}:${index + 1}`] : [])),
  );
}

const narrowed = /\b(it|test|describe)\s*\.\s*(only|skip|todo|failing)\b|\b(xit|xtest|xdescribe|fit|fdescribe)\s*\(/;
const unexplained = /((eslint|oxlint)-disable|@ts-(ignore|nocheck|expect-error))(?!.*(--|: )\s*\S+\s+\S+)/;
const machinePath = /(^|[^.\w])\/(work|farm|root|tmp|home|Users)\/[a-z]/;
const downloadAddress = /"resolved": "http/;
const privateKey =
  /-----BEGIN [A-Z ]*PRIVATE KEY|\b(sk|pk|rk)_live_\w{8}|\bAKIA[0-9A-Z]{16}\b|\bwhsec_[A-Za-z0-9+/]{24}/;

describe('The sources', () => {
  it('keep to 250 lines a file, but for specs, migrations and start data', () => {
    const long = code.filter((file) => !mayBeLong(file) && textOf(file).split('\n').length - 1 > 250);
    expect(long).toEqual([]);
  });

  it('narrow or skip no test', () => {
    expect(linesWith(specs, narrowed)).toEqual([]);
  });

  it('switch no check off without saying why', () => {
    expect(linesWith(code, unexplained)).toEqual([]);
  });

  it('name no path of one machine', () => {
    expect(linesWith(written, machinePath)).toEqual([]);
  });

  it('hold no secret', () => {
    expect(linesWith(written, privateKey)).toEqual([]);
  });

  it('leave out of the lock where packages were fetched', () => {
    expect(linesWith(['package-lock.json'], downloadAddress)).toEqual([]);
  });
});

describe('The checks of the sources', () => {
  const focused = ['it', 'only('].join('.');
  const skipped = ['describe', 'skip('].join('.');
  const home = ['', 'home', 'gilder'].join('/');
  const disable = ['eslint', 'disable-next-line'].join('-');
  const key = ['-----BEGIN', 'PRIVATE KEY-----'].join(' ');

  it.each([
    ['a focused test', focused, narrowed],
    ['a skipped suite', skipped, narrowed],
    ['a path of a machine', `cd ${home}`, machinePath],
    ['a check switched off', `// ${disable} no-eval`, unexplained],
    ['a private key', key, privateKey],
    ['an address of the lock', '"resolved": "https://somewhere.example/a.tgz"', downloadAddress],
  ])('see %s', (_what, line, pattern) => {
    expect(pattern.test(line)).toBe(true);
  });

  it.each([
    ['a word that ends so', 'commit.only(', narrowed],
    ['an address of the application', "'/api/home/jobs'", machinePath],
    ['a check switched off with its reason', `// ${disable} no-eval -- the driver wants a text`, unexplained],
  ])('pass %s', (_what, line, pattern) => {
    expect(pattern.test(line)).toBe(false);
  });
});

describe('The list of features', () => {
  const foldersOf = (side: string): string[] => [
    ...new Set(projectFiles([side], isCode).flatMap((file) => /^[^/]+(?=\/)/.exec(file.slice(side.length + 1)) ?? [])),
  ];
  const sides = {
    shared: [],
    'backend/src': ['platform', 'migrations'],
    'frontend/src/app': ['core', 'ui', 'shell'],
  } as const;
  const outside: readonly string[] = Object.values(sides).flat();
  const present = Object.keys(sides).flatMap((side) => foldersOf(side).map((folder) => ({ side, folder })));

  it('names every folder of the three sides', () => {
    const unlisted = present.filter(({ folder }) => !outside.includes(folder) && !features.includes(folder));
    expect(unlisted.map(({ side, folder }) => `${side}/${folder}`)).toEqual([]);
  });

  it('names each once', () => {
    expect(new Set(features).size).toBe(features.length);
  });
});
