import * as fc from 'fast-check';
import { busyWith, freeSpan, type BusySpans } from '#shared/drying/free-span';

const time = { day_minutes: 480, days: 5, productiveShare_percent: 100 };
const day = 1440;
const span = (start_minutes: number, end_minutes: number) => ({ start_minutes, end_minutes });

describe('Busy hands', () => {
  it.each([
    ['keep spans in their order', [span(300, 360)], span(0, 60), [span(0, 60), span(300, 360)]],
    ['join a span to the one before it', [span(0, 60)], span(60, 90), [span(0, 90)]],
    ['join a span to the one after it', [span(60, 90)], span(0, 60), [span(0, 90)]],
    ['close a gap between two', [span(0, 60), span(90, 120)], span(60, 90), [span(0, 120)]],
    ['are not made busier by work of no time', [span(0, 60)], span(90, 90), [span(0, 60)]],
  ])('%s', (_sentence, busy, more, expected) => {
    expect(busyWith(busy, more)).toEqual(expected);
  });

  it.each([
    ['at once where nothing is in the way', [], span(100, 160)],
    ['in a gap that is long enough', [span(0, 90), span(200, 300)], span(100, 160)],
    ['after what is in the way', [span(110, 200)], span(200, 260)],
    ['past a gap that is too short', [span(90, 120), span(150, 480)], span(day, day + 60)],
  ] as const)('find an hour from minute 100 on %s', (_sentence, busy, expected) => {
    expect(freeSpan(busy, { from_minutes: 100, work_minutes: 60 }, time)).toEqual(expected);
  });

  it('law: whatever is taken one after another never clashes, and leaves no earlier room for an equal piece of work', () => {
    const wanted = fc.record({ from_minutes: fc.nat(6 * day), work_minutes: fc.integer({ min: 1, max: 700 }) });
    fc.assert(
      fc.property(fc.array(wanted, { maxLength: 25 }), (works) => {
        const taken: { start_minutes: number; end_minutes: number }[] = [];
        let busy: BusySpans = [];
        for (const work of works) {
          const found = freeSpan(busy, work, time);
          expect(found.start_minutes).toBeGreaterThanOrEqual(work.from_minutes);
          for (const one of taken)
            expect(one.end_minutes <= found.start_minutes || one.start_minutes >= found.end_minutes).toBe(true);
          taken.push(found);
          busy = busyWith(busy, found);
          expect(freeSpan(busy, work, time).start_minutes).toBeGreaterThanOrEqual(found.end_minutes);
        }
        for (let at = 1; at < busy.length; at += 1)
          expect(Number(busy[at]?.start_minutes)).toBeGreaterThan(Number(busy[at - 1]?.end_minutes));
      }),
    );
  });
});
