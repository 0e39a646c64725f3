import ICAL from 'ical.js';
import type { BenchJob } from '#shared/programme/bench-day-of';
import { programme } from '#shared/programme/programme';
import { minutesOfDay, programmeFrame, type ProgrammeFrame } from '#shared/programme/programme-frame';
import { personForSpecs, requestForSpecs, taskForSpecs } from '#shared/programme/request-for-specs';
import { oddDays } from '#shared/programme/odd-days';
import { weekdayHours } from '#shared/programme/request-for-specs';
import { formatsFor } from '#shared/units/formats-for';
import { wordsFor } from '../platform/http/words';
import { feedCalendar } from './feed-calendar';

const say = wordsFor(formatsFor({ locale: 'en-IE', currency: 'EUR', digits: 2, lengthUnit: 'mm' }));

/** Ten working days of one gilder from a day on, eight to twelve and one to five by the clock on the wall. */
function job(frame: ProgrammeFrame, name = 'Water gilding'): BenchJob {
  const { firstDay, timeZone } = frame;
  const request = requestForSpecs({
    calendar: {
      firstDay,
      week: weekdayHours,
      exceptions: [],
      productiveShare_percent: 100,
      oddDays: oddDays(firstDay, 60, timeZone),
    },
    people: [personForSpecs('gina', 'gilder')],
    tasks: [taskForSpecs('gild', { handsOn_minutes: 80 * 60 })],
  });
  const [{ id: taskId, lotId, gradeId, handsOn_minutes }] = request.tasks;
  const one = { coat: 2, coats: 3, portion: 1, portions: 1, memberIds: [], stepId: 'gild', kind: 'gesso' as const };
  return {
    ...{
      estimateId: 'estimate',
      number: '2026-007',
      title: 'Pier table; carved, gilt',
      placeHolds: [],
      approvals: [],
      marks: [],
      revision: 3,
      keptAt: '2027-02-01T09:30:00.000Z',
    },
    ...{ lags: request.lags, paces: [], plan: programme(request) },
    items: [
      {
        taskId,
        lotId,
        lot: name,
        pieceId: 'piece',
        piece: 'Table',
        name: 'Gesso',
        gradeId,
        grade: 'Gilder',
        handsOn_minutes,
        ...one,
      },
    ],
  };
}

function eventsFrom(firstDay: string, timeZone: string, name?: string) {
  const frame = programmeFrame(firstDay, timeZone);
  const text = feedCalendar({
    ...{
      name: 'The board',
      personId: null,
      jobs: [job(frame, name)],
      frame,
      now: new Date('2026-01-01T00:00:00Z'),
      say,
      nameOf: () => 'Gina',
    },
  });
  const calendar = new ICAL.Component(ICAL.parse(text));
  return { text, frame, calendar, events: calendar.getAllSubcomponents('vevent').map((one) => new ICAL.Event(one)) };
}

/** The clock on the wall of a zone, as the machine's own calendar has it. */
const wallClock = (at: Date, timeZone: string) =>
  new Intl.DateTimeFormat('sv-SE', { timeZone, dateStyle: 'short', timeStyle: 'short' }).format(at);

describe('A calendar for other programs', () => {
  it.each([
    ['over the change of the clocks in spring', '2026-03-23', 'Europe/Dublin', '2026-03-27', '2026-03-30'],
    ['over the change of the clocks in autumn', '2026-10-19', 'Europe/Vienna', '2026-10-23', '2026-10-26'],
    ['over a leap day', '2028-02-21', 'Europe/Dublin', '2028-02-28', '2028-02-29'],
    ['over the year’s end', '2026-12-28', 'America/New_York', '2026-12-31', '2027-01-01'],
  ])('%s says eight in the morning on the wall, read by another’s parser', (_, firstDay, zone, before, after) => {
    const { events } = eventsFrom(firstDay, zone);
    const starts = events.map((event) => wallClock(event.startDate.toJSDate(), zone));
    const ends = events.map((event) => wallClock(event.endDate.toJSDate(), zone));
    expect(new Set(starts.map((text) => text.slice(11)))).toEqual(new Set(['08:00', '13:00']));
    expect(new Set(ends.map((text) => text.slice(11)))).toEqual(new Set(['12:00', '17:00']));
    expect(starts).toEqual(expect.arrayContaining([`${before} 08:00`, `${after} 08:00`]));
  });

  it('is whole by RFC 5545: version, maker, stamps, lines of at most 75 octets ended by CRLF, texts escaped', () => {
    const { text, calendar, events } = eventsFrom(
      '2026-06-01',
      'Europe/Dublin',
      'Gesso, thin; in “Bölus” \\ über all the mouldings of the apron and legs',
    );
    expect(calendar.getFirstPropertyValue('version')).toBe('2.0');
    expect(calendar.getFirstPropertyValue('prodid')).toContain('Bolewright');
    expect(text.split('\r\n').every((line) => Buffer.byteLength(line) <= 75)).toBe(true);
    expect(text.replaceAll('\r\n', '')).not.toMatch(/[\r\n]/);
    for (const event of events)
      expect(event.component.getFirstPropertyValue('dtstamp')?.toString()).toBe('2026-01-01T00:00:00Z');
    expect(events[0].summary).toBe('2026-007 · Table: Gesso, coat 2 of 3');
    expect(events[0].description).toBe(
      'Pier table; carved, gilt\nLot: Gesso, thin; in “Bölus” \\ über all the mouldings of the apron and legs\nGina',
    );
  });

  it('keeps the name of an event while its task is there, so that other programs move it', () => {
    const uids = (from: string) => eventsFrom(from, 'Europe/Dublin').events.map(({ uid }) => uid);
    const [first, second] = [uids('2026-06-01'), uids('2026-06-08')];
    expect(new Set(first).size).toBe(first.length);
    expect(second).toEqual(first);
  });

  it('says by SEQUENCE and LAST-MODIFIED which plan an event is of, so that the newer one is believed (RFC 5545 3.8.7.3 and 3.8.7.4)', () => {
    const { events } = eventsFrom('2026-06-01', 'Europe/Dublin');
    expect(new Set(events.map(({ sequence }) => sequence))).toEqual(new Set([3]));
    const modified = events.map(({ component }) => component.getFirstPropertyValue('last-modified')?.toString());
    expect(new Set(modified)).toEqual(new Set(['2027-02-01T09:30:00Z']));
  });

  it('counts minutes from the start of its first day in the workshop’s zone', () => {
    const { frame, events } = eventsFrom('2026-06-01', 'Europe/Dublin');
    expect(minutesOfDay('2026-06-01', frame)).toBe(0);
    expect(events[0].startDate.toJSDate().toISOString()).toBe('2026-06-01T07:00:00.000Z');
  });
});
