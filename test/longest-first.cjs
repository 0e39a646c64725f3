const { basename } = require('node:path');
const { default: Sequencer } = require('@jest/test-sequencer');

/** The names of what `together.cjs` puts together say how long it takes. */
const secondsOf = ({ path }) => Number(/-(\d+)s\./.exec(basename(path))?.[1] ?? 0);

/** So that no worker is left alone with something long at the end. */
module.exports = class LongestFirst extends Sequencer {
  sort(tests) {
    return tests.toSorted((one, other) => secondsOf(other) - secondsOf(one));
  }
};
