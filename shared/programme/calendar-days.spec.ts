import { calendarDays, clockOf, momentsOf } from '#shared/programme/calendar-days';
import { programme } from '#shared/programme/programme';
import { calendarForSpecs, lagForSpecs, requestForSpecs, taskForSpecs } from '#shared/programme/request-for-specs';

/** From Friday, 26 March 2027; on Sunday the 28th clocks go forward an hour, as in the zones of the European Union. */
const spring = {
  ...calendarForSpecs(),
  firstDay: '2027-03-26',
  oddDays: [{ day: '2027-03-28', length_minutes: 1380 }],
};

describe('The days of a calendar', () => {
  it('follow one another, a day on which the clocks change being shorter or longer', () => {
    expect(calendarDays(spring, 4).map(({ day, start_minutes }) => [day, start_minutes])).toEqual([
      ['2027-03-26', 0],
      ['2027-03-27', 1440],
      ['2027-03-28', 2880],
      ['2027-03-29', 4260],
    ]);
  });

  it('have hours by the clock on the wall, which has changed before work begins', () => {
    const sunday = calendarDays(spring, 3)[2];
    expect(momentsOf([{ start_minutes: 480, end_minutes: 720 }], sunday)).toEqual([
      { start_minutes: 2880 + 420, end_minutes: 2880 + 660 },
    ]);
  });

  it.each([
    [0, '2027-03-26', '00:00'],
    [2880 + 420, '2027-03-28', '08:00'],
    [4260 + 480, '2027-03-29', '08:00'],
    [4260 + 1440 * 3, '2027-04-01', '00:00'],
  ])('tell the time of minute %s: %s, %s', (moment, day, time) => {
    expect(clockOf(moment, spring)).toEqual({ day, time });
  });

  it('run over the end of a year and a leap day', () => {
    const days = calendarDays({ ...calendarForSpecs(), firstDay: '2027-12-31' }, 62).map(({ day }) => day);
    expect([days[0], days[1], days[60], days[61]]).toEqual(['2027-12-31', '2028-01-01', '2028-02-29', '2028-03-01']);
  });
});

describe('A programme over the night the clocks change', () => {
  it('lets sixty hours of drying be sixty hours, though the wall clock says sixty-one', () => {
    const tasks = [taskForSpecs('gesso', { release_minutes: 16 * 60 }), taskForSpecs('bole')];
    const request = requestForSpecs({ calendar: spring, tasks, lags: [lagForSpecs('gesso', 'bole', { least: 3720 })] });
    // Done at 17:00 on Friday; 62 hours on it is 8:00 on Monday by the wall.
    const bole = programme(request).tasks[1];
    expect(clockOf(bole.start_minutes, spring)).toEqual({ day: '2027-03-29', time: '08:00' });
    expect(bole.start_minutes - 17 * 60).toBe(3720);
  });
});
