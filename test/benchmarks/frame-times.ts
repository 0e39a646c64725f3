import type { CDPSession, Page } from 'playwright-core';

/** What is done to a scroller in each frame, and for how many of them. */
export interface Motion {
  readonly kind: 'along' | 'down' | 'zoom';
  readonly frames: number;
}

/** Milliseconds from frame to frame while a scroller is moved in each, as the browser itself draws them. */
export async function frameTimes(page: Page, selector: string, motion: Motion): Promise<readonly number[]> {
  // What runs in the page names no function of its own: a name would be helped by something the page does not have.
  return page.locator(selector).evaluate(async (scroller, { kind, frames }) => {
    const moments: number[] = [];
    for (let at = 0; at <= frames; at += 1) {
      moments.push(await new Promise<number>((resolve) => requestAnimationFrame(resolve)));
      // There and back, so that what comes into view has not been drawn before and what was is drawn again.
      const way = at % 90 < 45 ? 1 : -1;
      if (kind === 'along') scroller.scrollLeft += 60 * way;
      else if (kind === 'down') scroller.scrollTop += 40 * way;
      else scroller.dispatchEvent(new WheelEvent('wheel', { ctrlKey: true, deltaY: 20 * way, clientX: 700 }));
    }
    return moments.slice(1).map((moment, at) => moment - moments[at]);
  }, motion);
}

/** The time so many hundredths of the frames took at most. */
export function shareOf(times: readonly number[], share: number): number {
  const inOrder = [...times].sort((one, other) => one - other);
  return inOrder[Math.floor(inOrder.length * share)] ?? Number.NaN;
}

/** Seconds of work its main thread has done for a page so far; what other programs do to the machine does not count. */
export async function workOf_seconds(session: CDPSession): Promise<number> {
  const { metrics } = await session.send('Performance.getMetrics');
  return metrics.find(({ name }) => name === 'TaskDuration')?.value ?? Number.NaN;
}

/** Asks the browser to count the work of a page's main thread. */
export async function workCounted(page: Page): Promise<CDPSession> {
  const session = await page.context().newCDPSession(page);
  await session.send('Performance.enable', { timeDomain: 'threadTicks' });
  return session;
}
