const { mkdirSync, readdirSync, rmSync, writeFileSync } = require('node:fs');
const { dirname, join } = require('node:path');
const config = require('../jest.config.cjs');
const long_seconds = require('./long-specs.json');

/**
 * How the whole run takes the specifications: many files as one, so that Angular, Sequelize and our own modules are read, and made fast,
 * once for all of them instead of once each. Every file stays a `describe` of its own, with hooks of its own. Two for two workers would
 * be quickest; more of them end more evenly and hold less at a time.
 */
const bundles = {
  'test/api': 4,
  'test/journeys': 8,
  backend: 2,
  frontend: 3,
  shared: 2,
  'test/architecture': 1,
  'test/reference': 1,
  'test/repositories': 1,
};

const root = dirname(__dirname);
const folder = join(root, '.cache/together');

const specsOf = (name) =>
  readdirSync(join(root, name), { recursive: true })
    .filter((file) => file.endsWith('.spec.ts'))
    .map((file) => join(name, file));

/** What took long in an earlier run is known; all else is short. A figure that is out of date costs evenness and nothing else. */
const secondsOf = (spec) => long_seconds[spec] ?? 1;

/** Dealt out by how long they take, the longest first, each to who has least. */
function dealtOut(specs, count) {
  const hands = Array.from({ length: count }, () => ({ specs: [], seconds: 0 }));
  for (const spec of specs.toSorted((one, other) => secondsOf(other) - secondsOf(one) || (one < other ? -1 : 1))) {
    const [hand] = hands.toSorted((one, other) => one.seconds - other.seconds);
    hand.specs.push(spec);
    hand.seconds += secondsOf(spec);
  }
  return hands;
}

const asOne = ({ specs }) =>
  specs
    .map((spec) => `describe(${JSON.stringify(spec)}, () => void require(${JSON.stringify(join(root, spec))}));\n`)
    .join('');

/** Their file names say how long they take, for whoever puts them in order. */
function bundled(project) {
  const count = bundles[project.displayName];
  if (count === undefined) return project;
  const own = join(folder, project.displayName);
  mkdirSync(own, { recursive: true });
  dealtOut(specsOf(project.displayName), count).forEach((hand, at) =>
    writeFileSync(join(own, `${at + 1}-${hand.seconds}s.spec.js`), asOne(hand)),
  );
  return { ...project, testMatch: [`${own}/*.spec.js`] };
}

rmSync(folder, { recursive: true, force: true });
module.exports = {
  ...config,
  testSequencer: join(__dirname, 'longest-first.cjs'),
  projects: config.projects.map(bundled),
};
