import { programmeFrame } from '#shared/programme/programme-frame';
import { clockOfMinutes, minutesOfClock } from './minutes-of-clock';

const frame = programmeFrame('2027-03-27', 'Europe/Dublin');

describe('A time as it is typed', () => {
  it.each([
    ['2027-03-27T08:30', 510],
    // The clocks go forward in the night to the 28th: an hour less has gone by at eight.
    ['2027-03-28T08:00', 1440 + 420],
    ['2027-03-29T08:00', 1440 + 1380 + 480],
  ])('%s is minute %d, and back', (text, minutes) => {
    expect(minutesOfClock(text, frame)).toBe(minutes);
    expect(clockOfMinutes(minutes, frame)).toBe(text);
  });

  it('is none where it is half a time', () => {
    expect(minutesOfClock('2027-03-28', frame)).toBeUndefined();
  });
});
