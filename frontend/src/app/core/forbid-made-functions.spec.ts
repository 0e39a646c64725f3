import type * as zod from 'zod/v4/core';
import { forbidMadeFunctions } from './forbid-made-functions';

describe('forbidMadeFunctions', () => {
  afterEach(() => forbidMadeFunctions());

  const jitlessOfZod = () => jest.requireActual<typeof zod>('zod/v4/core').config().jitless;

  it('is what zod finds when it comes', () => {
    Reflect.deleteProperty(globalThis, '__zod_globalConfig');
    forbidMadeFunctions();
    jest.isolateModules(() => {
      expect(jitlessOfZod()).toBe(true);
    });
  });

  it('reaches a zod that is there already', () => {
    Reflect.deleteProperty(globalThis, '__zod_globalConfig');
    jest.isolateModules(() => {
      expect(jitlessOfZod()).toBeUndefined();
      forbidMadeFunctions();
      expect(jitlessOfZod()).toBe(true);
    });
  });
});
