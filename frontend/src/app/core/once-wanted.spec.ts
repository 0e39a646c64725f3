import { onceWanted } from './once-wanted';

/** A place whose coming into view is told by hand. */
function place() {
  let told: (entries: { isIntersecting: boolean }[]) => void = () => undefined;
  const disconnect = jest.fn();
  class Observer {
    readonly disconnect = disconnect;
    readonly observe = () => undefined;
    constructor(tell: typeof told) {
      told = tell;
    }
  }
  Object.assign(globalThis, { IntersectionObserver: Observer });
  return { element: document.createElement('p'), disconnect, inView: (is: boolean) => told([{ isIntersecting: is }]) };
}

const soon = (promise: Promise<boolean>) =>
  Promise.race([promise, new Promise<undefined>((resolve) => setTimeout(() => resolve(undefined), 20))]);

describe('onceWanted', () => {
  afterEach(() => Reflect.deleteProperty(globalThis, 'IntersectionObserver'));

  it.each(['pointerdown', 'wheel', 'scroll', 'keydown', 'focusin'])('wants everything after a %s', async (sign) => {
    const wanted = onceWanted(window, null, 10_000);
    expect(await soon(wanted)).toBeUndefined();
    document.body.dispatchEvent(new Event(sign));
    expect(await soon(wanted)).toBe(true);
  });

  it('wants everything after a while in any case', async () => {
    expect(await soon(onceWanted(window, null, 1))).toBe(true);
  });

  it('wants the next of it where its place is in view, and looks no more', async () => {
    const { element, inView, disconnect } = place();
    const wanted = onceWanted(window, element, 10_000);
    inView(false);
    expect(await soon(wanted)).toBeUndefined();
    inView(true);
    expect(await soon(wanted)).toBe(false);
    expect(disconnect).toHaveBeenCalledTimes(1);
  });
});
