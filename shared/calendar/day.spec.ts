import fc from 'fast-check';
import { addDays, addMonths, compareDays, daysBetween, validityEnd } from '#shared/calendar/add-days';
import { dayNumber, dayOfNumber, isDay } from '#shared/calendar/day';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import { formatDay } from '#shared/calendar/format-day';
import { addWorkingDays, isWorkingDay, weekdayOf } from '#shared/calendar/working-days';

const fiveDays = { weekdays: [1, 2, 3, 4, 5], closed: ['2026-12-25'] } as const;

describe('a plain day', () => {
  it.each([
    ['2024-02-29', true],
    ['2023-02-29', false],
    ['1900-02-29', false],
    ['2000-02-29', true],
    ['2026-13-01', false],
    ['2026-04-31', false],
    ['2026-4-1', false],
    ['0000-01-01', false],
  ])('%s is a day: %s', (text, expected) => {
    expect(isDay(text)).toBe(expected);
  });

  it.each([
    ['2026-02-28', 1, '2026-03-01'],
    ['2024-02-28', 1, '2024-02-29'],
    ['2025-12-31', 1, '2026-01-01'],
    ['2026-03-01', -1, '2026-02-28'],
    ['2026-01-15', 365, '2027-01-15'],
  ])('%s and %d days is %s', (day, days, expected) => {
    expect(addDays(day, days)).toBe(expected);
    expect(daysBetween(day, expected)).toBe(days);
  });

  it.each([
    ['2026-01-31', 1, '2026-02-28'],
    ['2024-01-31', 1, '2024-02-29'],
    ['2026-11-30', 3, '2027-02-28'],
    ['2026-01-15', -1, '2025-12-15'],
    ['2026-03-31', 12, '2027-03-31'],
  ])('%s and %d months is %s', (day, months, expected) => {
    expect(addMonths(day, months)).toBe(expected);
  });

  it('agrees with the calendar of the machine on every day', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 3_652_058 }), (count) => {
        const day = dayOfNumber(count);
        expect(dayNumber(day)).toBe(count);
        const date = new Date(`${day}T00:00:00Z`);
        expect(date.toISOString().slice(0, 10)).toBe(day);
        expect(weekdayOf(day)).toBe(date.getUTCDay() || 7);
        expect((date.getTime() - Date.UTC(1970, 0, 1)) / 86_400_000).toBe(daysBetween('1970-01-01', day));
      }),
    );
  });

  it('is compared, and ends an offer after so many days', () => {
    expect(compareDays('2026-01-02', '2026-01-10')).toBeLessThan(0);
    expect(validityEnd('2026-01-31', 30)).toBe('2026-03-02');
  });

  it('is refused outside its years, or when there is none', () => {
    expect(() => addDays('9999-12-31', 1)).toThrow(RangeError);
    expect(() => addDays('2026-02-30', 1)).toThrow(RangeError);
    expect(() => addDays('2026-02-03', 0.5)).toThrow(RangeError);
  });
});

describe('working days', () => {
  it.each([
    ['2026-12-24', 1, '2026-12-28'],
    ['2026-12-18', 5, '2026-12-28'],
    ['2026-12-28', -1, '2026-12-24'],
    ['2026-12-26', 0, '2026-12-28'],
    ['2026-12-28', 0, '2026-12-28'],
  ])('%s and %d working days is %s', (day, count, expected) => {
    expect(addWorkingDays(day, count, fiveDays)).toBe(expected);
    expect(isWorkingDay(expected, fiveDays)).toBe(true);
  });

  it('counts as many working days as were asked for', () => {
    fc.assert(
      fc.property(fc.integer({ min: 730_000, max: 750_000 }), fc.integer({ min: 1, max: 60 }), (start, asked) => {
        const from = dayOfNumber(start);
        const to = addWorkingDays(from, asked, fiveDays);
        let counted = 0;
        for (let day = addDays(from, 1); compareDays(day, to) <= 0; day = addDays(day, 1)) {
          if (isWorkingDay(day, fiveDays)) counted += 1;
        }
        expect(counted).toBe(asked);
      }),
    );
  });

  it('is refused where nobody ever works', () => {
    expect(() => addWorkingDays('2026-01-01', 1, { weekdays: [], closed: [] })).toThrow(RangeError);
  });
});

describe('an instant and a locale', () => {
  it('falls on the day of the zone', () => {
    const lateEvening = Date.UTC(2026, 5, 30, 23, 30);
    expect(dayOfInstant(lateEvening, 'UTC')).toBe('2026-06-30');
    expect(dayOfInstant(lateEvening, 'Europe/Vienna')).toBe('2026-07-01');
    expect(dayOfInstant(Date.UTC(2026, 6, 1, 2), 'America/New_York')).toBe('2026-06-30');
  });

  it('is written in the order of the locale', () => {
    expect(formatDay('2026-03-05', 'en-GB')).toBe('5 Mar 2026');
    expect(formatDay('2027-01-30', 'de-DE')).toBe('30. Jan. 2027');
  });
});
