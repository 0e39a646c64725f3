import { instantAfterDay } from './instant-after-day';

test.each([
  // Offsets from the IANA database: UTC+1 and +2 in Vienna, −5 in New York, +14 on Kiritimati, −11 on Niue, +5:45 in Kathmandu.
  ['2027-01-15', 'Europe/Vienna', '2027-01-15T23:00:00.000Z'],
  ['2027-03-28', 'Europe/Vienna', '2027-03-28T22:00:00.000Z'],
  ['2027-10-31', 'Europe/Vienna', '2027-10-31T23:00:00.000Z'],
  ['2027-12-31', 'America/New_York', '2028-01-01T05:00:00.000Z'],
  ['2027-06-01', 'Pacific/Kiritimati', '2027-06-01T10:00:00.000Z'],
  ['2027-06-01', 'Pacific/Niue', '2027-06-02T11:00:00.000Z'],
  ['2028-02-29', 'Asia/Kathmandu', '2028-02-29T18:15:00.000Z'],
])('%s in %s is over at %s', (day, zone, expected) => {
  expect(instantAfterDay(day, zone).toISOString()).toBe(expected);
});
