import * as fc from 'fast-check';
import { commonSpans, personSpans } from '#shared/programme/person-spans';
import { calendarDays } from '#shared/programme/calendar-days';
import { calendarForSpecs, personForSpecs } from '#shared/programme/request-for-specs';
import { WorkingSpans } from '#shared/programme/working-spans';

const calendar = calendarForSpecs();
const days = calendarDays(calendar, 14);
const gina = personSpans(days, personForSpecs('gina', 'gilder'), calendar);
const hour = 60;

describe('Working hours', () => {
  it.each([
    ['a minute of work is itself', 9 * hour, 9 * hour],
    ['the pause waits for its end', 12 * hour, 13 * hour],
    ['the evening waits for the morning', 17 * hour, 1440 + 8 * hour],
    ['Friday evening waits for Monday', 4 * 1440 + 18 * hour, 7 * 1440 + 8 * hour],
  ])('%s', (_, moment, start) => {
    expect(gina.startAt(moment)).toBe(start);
  });

  it('end where their work is done, not where the next begins', () => {
    expect(gina.endOf(8 * hour, 240)).toBe(12 * hour);
    expect(gina.endOf(8 * hour, 241)).toBe(13 * hour + 1);
  });

  it('take what may not be broken over a pause, but not overnight', () => {
    expect(gina.unbrokenStart(11 * hour, 240)).toBe(11 * hour);
    expect(gina.unbrokenStart(14 * hour, 240)).toBe(1440 + 8 * hour);
    expect(gina.unbrokenStart(0, 481)).toBe(Infinity);
  });

  it('of somebody who is away at noon are two halves, over which nothing unbroken goes', () => {
    const away = [{ start_minutes: 10 * hour, end_minutes: 11 * hour }];
    const spans = personSpans(days, { ...personForSpecs('otto', 'gilder'), away }, calendar);
    expect(spans.unbrokenStart(8 * hour, 150)).toBe(11 * hour);
    expect(commonSpans(gina, spans).unbrokenStart(8 * hour, 150)).toBe(11 * hour);
  });

  it('begin for an end no earlier than ends by then, and no later than need be', () => {
    const moments = fc.integer({ min: 600, max: 13 * 1440 });
    fc.assert(
      fc.property(moments, fc.integer({ min: 1, max: 900 }), (end, work) => {
        const start = gina.startFor(end, work);
        fc.pre(start !== -Infinity && start !== Infinity);
        expect(gina.endOf(start, work)).toBeGreaterThanOrEqual(end);
        const before = gina.workedBy(start) - 1;
        if (before >= 0) expect(gina.momentOf(before + work)).toBeLessThan(end);
      }),
      { seed: 5 },
    );
  });

  it('seen backward are the same', () => {
    const back = new WorkingSpans(gina.mirrored().mirrored().spans);
    expect(back.spans).toEqual(gina.spans);
    expect(gina.mirrored().startAt(-13 * hour)).toBe(-12 * hour);
  });
});
