import { exceptionsByDay, hoursOn, momentsOf, type CalendarDay } from '#shared/programme/calendar-days';
import type { MomentSpan, Person, ShopCalendar, WeekHours } from '#shared/programme/shop-calendar';
import { WorkingSpans, type GroupedSpan } from '#shared/programme/working-spans';

/** Absences in order, those that overlap or touch as one. */
function gapsOf(away: readonly MomentSpan[]): MomentSpan[] {
  const gaps: MomentSpan[] = [];
  for (const gap of [...away].sort((a, b) => a.start_minutes - b.start_minutes)) {
    const last = gaps.at(-1);
    if (last && gap.start_minutes <= last.end_minutes)
      gaps[gaps.length - 1] = { ...last, end_minutes: Math.max(last.end_minutes, gap.end_minutes) };
    else gaps.push(gap);
  }
  return gaps;
}

/** Spans with absences taken out; who is away in the middle of a day begins a new group after it. */
function without(spans: readonly GroupedSpan[], away: readonly MomentSpan[]): GroupedSpan[] {
  const gaps = gapsOf(away);
  let parted = 0;
  let next = 0;
  return spans.flatMap(({ start_minutes, end_minutes, group }) => {
    const left: GroupedSpan[] = [];
    let start = start_minutes;
    const add = (end: number): void => {
      if (start < end) left.push({ start_minutes: start, end_minutes: end, group: group + parted });
    };
    while (next < gaps.length && gaps[next].start_minutes < end_minutes) {
      add(gaps[next].start_minutes);
      start = Math.max(start, gaps[next].end_minutes);
      if (gaps[next].end_minutes > end_minutes) break;
      next += 1;
      parted += 1;
    }
    add(end_minutes);
    return left;
  });
}

/** Spans that touch are one, so that work may go on over midnight where people work day and night. */
function joined(spans: readonly GroupedSpan[]): GroupedSpan[] {
  const out: GroupedSpan[] = [];
  for (const span of spans) {
    const last = out.at(-1);
    if (last?.end_minutes === span.start_minutes) out[out.length - 1] = { ...last, end_minutes: span.end_minutes };
    else out.push(span);
  }
  return out;
}

/** Hours by week and exceptions over days, as moments, each day a group of its own. */
function spansOf(days: readonly CalendarDay[], week: WeekHours, exceptions: ShopCalendar['exceptions']): GroupedSpan[] {
  const byDay = exceptionsByDay(exceptions);
  const spans = days.flatMap((day, group) =>
    momentsOf(hoursOn(day, week, byDay), day).map((span) => ({ ...span, group })),
  );
  return joined(spans.filter((span) => span.start_minutes < span.end_minutes));
}

/** The hours of the workshop over days of its calendar. */
export const shopSpans = (days: readonly CalendarDay[], { week, exceptions }: ShopCalendar): WorkingSpans =>
  new WorkingSpans(spansOf(days, week, exceptions));

/** The hours of one person over days of the calendar: their own week or the workshop's, exceptions of both, without what they are away. */
export function personSpans(days: readonly CalendarDay[], person: Person, calendar: ShopCalendar): WorkingSpans {
  const exceptions = [...calendar.exceptions, ...person.exceptions];
  return new WorkingSpans(without(spansOf(days, person.week ?? calendar.week, exceptions), person.away));
}

/** The hours of each of several people; those who have the workshop's hours have them worked out once (`shop`). */
export const peopleSpans = (
  days: readonly CalendarDay[],
  { people, calendar }: { readonly people: readonly Person[]; readonly calendar: ShopCalendar },
  shop: WorkingSpans,
): WorkingSpans[] =>
  people.map((person) => {
    if (person.week !== null || person.exceptions.length > 0) return personSpans(days, person, calendar);
    return person.away.length === 0 ? shop : new WorkingSpans(without(shop.spans, person.away));
  });

/** The hours at which all of several people work. */
export function commonSpans(one: WorkingSpans, other: WorkingSpans): WorkingSpans {
  const found: GroupedSpan[] = [];
  let group = 0;
  let last: readonly [number, number] | null = null;
  for (let a = 0, b = 0; a < one.spans.length && b < other.spans.length;) {
    const [first, second] = [one.spans[a], other.spans[b]];
    const start_minutes = Math.max(first.start_minutes, second.start_minutes);
    const end_minutes = Math.min(first.end_minutes, second.end_minutes);
    if (start_minutes < end_minutes) {
      if (last && (last[0] !== first.group || last[1] !== second.group)) group += 1;
      found.push({ start_minutes, end_minutes, group });
      last = [first.group, second.group];
    }
    if (first.end_minutes <= second.end_minutes) a += 1;
    else b += 1;
  }
  return new WorkingSpans(found);
}
