const { createCjsPreset } = require('jest-preset-angular/presets');

const swc = (parser) => [
  '@swc/jest',
  {
    jsc: { target: 'es2022', parser, keepClassNames: true },
    module: { type: 'commonjs' },
    sourceMaps: 'inline',
    swcrc: false,
  },
];

/** Packages that come as modules of the language alone. */
const modules = '(@asamuzakjp|@csstools|@exodus|entities|icosphere|parse5|pdfjs-dist)/';

const node = (name) => ({
  displayName: name,
  /** One for all of them, so that a module is transformed once and not once for each kind of test. */
  id: 'node',
  rootDir: __dirname,
  testEnvironment: '<rootDir>/test/environment/node-environment.cjs',
  testMatch: [`<rootDir>/${name}/**/*.spec.ts`],
  transform: {
    '^.+\\.ts$': swc({ syntax: 'typescript', decorators: true }),
    [`node_modules/${modules}.+\\.m?js$`]: swc({ syntax: 'ecmascript' }),
  },
  transformIgnorePatterns: [`node_modules/(?!${modules})`],
});

/** Threads start from what `build-programs.mjs` put together: read from the sources each start would take seconds. */
const onDatabase = (name) => ({
  ...node(name),
  moduleNameMapper: {
    '/threads/thread-file$': '<rootDir>/test/programs/thread-file.ts',
    '^@node-rs/argon2$': '<rootDir>/test/programs/argon2.ts',
  },
  globalSetup: '<rootDir>/test/database/jest-set-up.mjs',
  globalTeardown: '<rootDir>/test/database/jest-tear-down.mjs',
});

module.exports = {
  maxWorkers: 2,
  /** What test files leave behind fills a worker, and then it mostly sweeps: a fresh one takes the next file sooner. */
  workerIdleMemoryLimit: '1GB',
  /** A busy machine makes a test slow, not wrong. */
  testTimeout: 60_000,
  projects: [
    {
      ...createCjsPreset({ tsconfig: '<rootDir>/frontend/tsconfig.spec.json' }),
      transformIgnorePatterns: ['node_modules/(?!(.*\\.mjs$|@angular/common/locales/.*\\.js$))'],
      testEnvironment: 'jest-preset-angular/environments/jest-jsdom-env',
      displayName: 'frontend',
      rootDir: __dirname,
      testMatch: ['<rootDir>/frontend/src/**/*.spec.ts'],
      setupFilesAfterEnv: ['<rootDir>/frontend/src/test/setup-jest.ts'],
    },
    onDatabase('backend'),
    node('shared'),
    node('test/architecture'),
    node('test/benchmarks'),
    node('test/reference'),
    node('test/start'),
    ...['api', 'repositories'].map((folder) => onDatabase(`test/${folder}`)),
    { ...onDatabase('test/journeys'), globalSetup: '<rootDir>/test/journeys/built-pages.mjs' },
  ],
};
