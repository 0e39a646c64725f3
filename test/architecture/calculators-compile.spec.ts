import * as path from 'node:path';
import * as ts from 'typescript';
import { projectRoot } from './project-root';

const configuration = path.join(projectRoot, 'shared/tsconfig.calculators.json');

/** Files that exist only here, by their path, with what a calculator must not reach. */
const planted: Readonly<Record<string, string>> = {
  'shared/leaf/planted-page.ts': 'export const width_mm = () => document.body.clientWidth;\n',
  'shared/leaf/planted-store.ts': "export const kept = () => localStorage.getItem('leaf');\n",
  'shared/leaf/planted-call.ts': "export const fetched = () => fetch('/api/jobs');\n",
  'shared/leaf/planted-timer.ts': 'export const later = (work: () => void) => setTimeout(work, 600);\n',
  'shared/leaf/planted-log.ts': "export const told = () => console.log('leaf');\n",
  'shared/leaf/planted-process.ts': 'export const place = () => process.env;\n',
  'shared/leaf/planted-bytes.ts': "export const bytes = () => Buffer.from('leaf');\n",
  'shared/leaf/planted-node.ts': "import { readFileSync } from 'node:fs';\nexport const read = () => readFileSync;\n",
  'shared/leaf/planted-secret.ts': 'export const chance = () => crypto.randomUUID();\n',
};

const innocent = 'shared/leaf/planted-innocent.ts';
const innocentText =
  "import { D } from '#shared/money/decimal';\nexport const half = (): string => new D('1').div(2).toString();\n";

const absolute = (file: string): string => path.join(projectRoot, file);

const virtual = new Map(
  [...Object.entries(planted), [innocent, innocentText] as const].map(([file, text]) => [absolute(file), text]),
);

function hostWithPlanted(options: ts.CompilerOptions): ts.CompilerHost {
  const host = ts.createCompilerHost(options);
  return {
    ...host,
    fileExists: (name) => virtual.has(name) || host.fileExists(name),
    readFile: (name) => virtual.get(name) ?? host.readFile(name),
    getSourceFile: (name, language) => {
      const text = virtual.get(name) ?? host.readFile(name);
      return text === undefined ? undefined : ts.createSourceFile(name, text, language);
    },
  };
}

/** What the compiler says about the calculators and the planted files, by the file it says it of. */
function complaints(): ReadonlyMap<string, readonly string[]> {
  const { options, fileNames } = ts.parseJsonConfigFileContent(
    ts.readConfigFile(configuration, ts.sys.readFile).config,
    ts.sys,
    path.dirname(configuration),
    undefined,
    configuration,
  );
  const program = ts.createProgram([...fileNames, ...virtual.keys()], options, hostWithPlanted(options));
  const found = new Map<string, string[]>();
  for (const { file, messageText } of ts.getPreEmitDiagnostics(program)) {
    const at = file ? path.relative(projectRoot, file.fileName) : 'the configuration';
    found.set(at, [...(found.get(at) ?? []), ts.flattenDiagnosticMessageText(messageText, ' ')]);
  }
  return found;
}

describe('The calculators', () => {
  let found: ReturnType<typeof complaints> = new Map();

  beforeAll(() => {
    found = complaints();
  }, 60_000);

  it('compile with neither the page nor Node', () => {
    expect([...found].filter(([file]) => !(file in planted))).toEqual([]);
  });

  it.each(Object.keys(planted))('could not reach beyond themselves: %s', (file) => {
    expect(found.get(file)?.join(' ')).toMatch(/Cannot find/);
  });
});
