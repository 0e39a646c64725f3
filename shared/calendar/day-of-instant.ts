import { type Day, dayFrom } from '#shared/calendar/day';

/** The day it is in an IANA zone at an instant (milliseconds since 1970 UTC); RangeError for a zone that is not known. */
export function dayOfInstant(instant_ms: number, zone: string): Day {
  const format = new Intl.DateTimeFormat('en-GB', {
    timeZone: zone,
    calendar: 'gregory',
    numberingSystem: 'latn',
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
  });
  const parts = new Map(format.formatToParts(instant_ms).map((part) => [part.type, Number(part.value)]));
  return dayFrom(parts.get('year') ?? 0, parts.get('month') ?? 0, parts.get('day') ?? 0);
}
