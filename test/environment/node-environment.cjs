const { constants, createContext, runInContext } = require('node:vm');
const { TestEnvironment } = require('jest-environment-node');

/** What tests and Node must share, although every context has its own. */
const shared = new Set(['ArrayBuffer', 'Buffer', 'Uint8Array']);

/**
 * Jest's environment for Node, in a plain context. Jest's own watches each name that is looked up in the global object, which makes a
 * `Math.floor` a hundred times slower, and a calculator twice.
 */
module.exports = class NodeEnvironment extends TestEnvironment {
  constructor(config, context) {
    super(config, context);
    const watched = this.global;
    this.context = createContext(constants.DONT_CONTEXTIFY);
    this.global = runInContext('globalThis', this.context);
    const own = new Set(Reflect.ownKeys(this.global));
    for (const key of Reflect.ownKeys(watched)) {
      if (own.has(key) && !shared.has(key)) continue;
      const { enumerable } = Object.getOwnPropertyDescriptor(watched, key);
      Object.defineProperty(this.global, key, { configurable: true, enumerable, writable: true, value: watched[key] });
    }
    this.global.global = this.global;
    this.moduleMocker = new this.moduleMocker.constructor(this.global);
    this.fakeTimersModern = new this.fakeTimersModern.constructor({
      config: config.projectConfig,
      global: this.global,
    });
  }
};
