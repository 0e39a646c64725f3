import type { DayHours } from '#shared/programme/shop-calendar';

const two = (figure: number): string => String(figure).padStart(2, '0');
const clock = (minutes: number): string => `${two(Math.floor(minutes / 60))}:${two(minutes % 60)}`;

/** Hours of a day as they are typed: 08:00–12:30, 13:00–17:00; nothing where it is not worked. */
export const hoursText = (hours: DayHours): string =>
  hours.map(({ start_minutes, end_minutes }) => `${clock(start_minutes)}–${clock(end_minutes)}`).join(', ');

const span = /^(\d{1,2})(?:[:.](\d{2}))?\s*(?:-|–|—|to)\s*(\d{1,2})(?:[:.](\d{2}))?$/i;

const minutesOf = (hour: string, minute: string | undefined): number => Number(hour) * 60 + Number(minute ?? 0);

/** Reads hours as people write them (8-12.30, 13:00 to 17:00); undefined where the text says none, or none that follow each other. */
export function readHours(text: string): DayHours | undefined {
  const parts = text
    .split(/[,;]/)
    .map((part) => part.trim())
    .filter(Boolean);
  const spans = parts.flatMap((part) => {
    const [, hour, minute, endHour, endMinute] = span.exec(part) ?? [];
    return hour === undefined
      ? []
      : [{ start_minutes: minutesOf(hour, minute), end_minutes: minutesOf(endHour, endMinute) }];
  });
  const isInOrder = spans.every(
    ({ start_minutes, end_minutes }, at) =>
      start_minutes < end_minutes && end_minutes <= 1440 && start_minutes >= (spans[at - 1]?.end_minutes ?? 0),
  );
  return spans.length === parts.length && spans.length <= 6 && isInOrder ? spans : undefined;
}
