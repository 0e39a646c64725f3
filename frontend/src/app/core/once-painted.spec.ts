import { oncePainted } from './once-painted';

/** A window whose pictures and tasks come when they are told to. */
function still() {
  const [frames, tasks]: [(() => void)[], { run: () => void; after: number }[]] = [[], []];
  const window = {
    requestAnimationFrame: (run: () => void) => frames.push(run),
    setTimeout: (run: () => void, after = 0) => tasks.push({ run, after }),
  } as unknown as Window;
  return { window, draw: () => frames.shift()?.(), due: (after: number) => tasks.find((one) => one.after === after) };
}

describe('oncePainted', () => {
  const settled = async (promise: Promise<void>) =>
    Promise.race([promise.then(() => true), new Promise((resolve) => setTimeout(() => resolve(false)))]);

  it('ends in the task after the picture that shows what was written', async () => {
    const { window, draw, due } = still();
    const painted = oncePainted(window);
    draw();
    expect(due(0)).toBeUndefined();
    draw();
    expect(await settled(painted)).toBe(false);
    due(0)?.run();
    expect(await settled(painted)).toBe(true);
  });

  it('does not wait for pictures of a tab nobody sees', async () => {
    const { window, due } = still();
    const painted = oncePainted(window, 200);
    due(200)?.run();
    expect(await settled(painted)).toBe(true);
  });
});
