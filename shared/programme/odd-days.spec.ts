import fc from 'fast-check';
import { addDays } from '#shared/calendar/add-days';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import { dayOfMinutes, instantOf, minutesOf, minutesOfDay, programmeFrame } from '#shared/programme/programme-frame';
import { oddDays, startOfDay_ms } from '#shared/programme/odd-days';

describe('The start of a day', () => {
  // Offsets as the IANA database has them: Dublin UTC+0, in summer +1; Vienna +1/+2; New York −5/−4; Kathmandu +5:45; Havana and Beirut change at midnight.
  it.each([
    ['an ordinary winter day', '2026-01-15', 'Europe/Dublin', '2026-01-15T00:00:00.000Z'],
    ['a summer day', '2026-07-15', 'Europe/Dublin', '2026-07-14T23:00:00.000Z'],
    ['the day the clocks go forward', '2026-03-29', 'Europe/Vienna', '2026-03-28T23:00:00.000Z'],
    ['the day after', '2026-03-30', 'Europe/Vienna', '2026-03-29T22:00:00.000Z'],
    ['the day they go back', '2026-10-25', 'Europe/Vienna', '2026-10-24T22:00:00.000Z'],
    ['west of Greenwich', '2026-11-01', 'America/New_York', '2026-11-01T04:00:00.000Z'],
    ['a quarter of an hour off', '2026-05-01', 'Asia/Kathmandu', '2026-04-30T18:15:00.000Z'],
    ['a day without a midnight', '2026-03-08', 'America/Havana', '2026-03-08T05:00:00.000Z'],
    ['a leap day', '2028-02-29', 'Europe/Dublin', '2028-02-29T00:00:00.000Z'],
    ['a new year', '2027-01-01', 'Pacific/Auckland', '2026-12-31T11:00:00.000Z'],
  ])('%s: %s in %s is %s', (_, day, zone, expected) => {
    expect(new Date(startOfDay_ms(day, zone)).toISOString()).toBe(expected);
  });

  it('is the first instant that bears the day, wherever and whenever', () => {
    const zones = [
      'Europe/Dublin',
      'America/New_York',
      'Australia/Lord_Howe',
      'Asia/Kathmandu',
      'America/Havana',
      'Pacific/Chatham',
    ];
    fc.assert(
      fc.property(fc.constantFrom(...zones), fc.integer({ min: 0, max: 4000 }), (zone, days) => {
        const day = addDays('2024-01-01', days);
        const start_ms = startOfDay_ms(day, zone);
        expect(dayOfInstant(start_ms, zone)).toBe(day);
        expect(dayOfInstant(start_ms - 1, zone) < day).toBe(true);
      }),
    );
  });

  it('is refused in a zone there is not', () => {
    expect(() => startOfDay_ms('2026-01-01', 'Mars/Olympus')).toThrow(RangeError);
  });
});

describe('Days of another length', () => {
  it('are those on which the clocks change, an hour shorter in spring and longer in autumn', () => {
    expect(oddDays('2026-01-01', 730, 'Europe/Dublin')).toEqual([
      { day: '2026-03-29', length_minutes: 1380 },
      { day: '2026-10-25', length_minutes: 1500 },
      { day: '2027-03-28', length_minutes: 1380 },
      { day: '2027-10-31', length_minutes: 1500 },
    ]);
  });

  it('are half an hour off on Lord Howe Island, and there are none where the clocks are left alone', () => {
    expect(oddDays('2026-01-01', 365, 'Australia/Lord_Howe').map(({ length_minutes }) => length_minutes)).toEqual([
      1470, 1410,
    ]);
    expect(oddDays('2026-01-01', 3650, 'UTC')).toEqual([]);
  });
});

describe('Minutes of a programme', () => {
  const frame = programmeFrame('2026-03-28', 'Europe/Dublin');

  it('run on through the change of the clocks: eight in the morning two days later is an hour nearer', () => {
    expect(minutesOf('2026-03-28T08:00:00.000Z', frame)).toBe(480);
    expect(minutesOf('2026-03-30T07:00:00.000Z', frame)).toBe(2 * 1440 + 480 - 60);
    expect(minutesOfDay('2026-03-30', frame)).toBe(2 * 1440 - 60);
    expect(dayOfMinutes(2 * 1440 - 61, frame)).toBe('2026-03-29');
  });

  it('and instants are each other’s inverse', () => {
    fc.assert(
      fc.property(fc.integer({ min: -1e6, max: 4e6 }), (minutes) => {
        expect(minutesOf(instantOf(minutes, frame), frame)).toBe(minutes);
      }),
    );
  });
});
