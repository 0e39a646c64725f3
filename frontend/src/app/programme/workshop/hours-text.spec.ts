import { hoursText, readHours } from './hours-text';

const span = (start_minutes: number, end_minutes: number) => ({ start_minutes, end_minutes });

describe('Hours of a day as text', () => {
  it('are written with their pause', () => {
    expect(hoursText([span(480, 750), span(780, 1020)])).toBe('08:00–12:30, 13:00–17:00');
    expect(hoursText([])).toBe('');
  });

  it.each([
    ['8-12.30, 13-17', [span(480, 750), span(780, 1020)]],
    ['07:30 – 16:00', [span(450, 960)]],
    ['9 to 24', [span(540, 1440)]],
    ['', []],
  ])('are read from “%s”', (text, hours) => {
    expect(readHours(text)).toEqual(hours);
  });

  it.each(['mornings', '8', '12-8', '8-25', '8-12, 11-15', '8-12 and 13-17'])('are not read from “%s”', (text) => {
    expect(readHours(text)).toBeUndefined();
  });
});
