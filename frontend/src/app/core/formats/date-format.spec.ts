import { dateFormat } from './date-format';

describe('dateFormat', () => {
  const day = { day: 'numeric', month: 'long', timeZone: 'UTC' } as const;
  const first = new Date('2026-06-04T00:00:00Z');

  it('is made once for a locale and what is written', () => {
    expect(dateFormat('en-GB', day)).toBe(dateFormat('en-GB', { ...day }));
    expect(dateFormat('en-GB', day).format(first)).toBe('4 June');
  });

  it('is another one for another locale, another style or another zone', () => {
    expect(dateFormat('en-US', day).format(first)).toBe('June 4');
    expect(dateFormat('en-GB', { ...day, month: 'short' }).format(first)).toBe('4 Jun');
    expect(dateFormat('en-GB', { ...day, timeZone: 'America/New_York' }).format(first)).toBe('3 June');
  });
});
