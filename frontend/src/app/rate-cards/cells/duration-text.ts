import { parseNumber } from '#shared/units/parse-number';
import { type Parsed, unread } from '#shared/units/parsed';

const minutesOf: Readonly<Record<string, number>> = { min: 1, m: 1, h: 60, d: 1440 };

/** One figure with its unit; a figure alone is in minutes. */
const part = /^\s*([\d.,]+)\s*(min|m|h|d)?\s*(?=$|[\d\s])/;

/** Reads a duration as somebody types it: 45, 45 min, 12 h, 1,5 h, 2 d 4 h. Gives minutes, or a complaint. */
export function parseDuration(text: string, locale: string): Parsed<{ minutes: number }> {
  if (text.trim() === '') return unread('entry-missing');
  let rest = text.trim().toLowerCase();
  let minutes = 0;
  while (rest !== '') {
    const found = part.exec(rest);
    if (!found) return unread('rate-card-duration-unclear');
    const figure = parseNumber(found[1], locale);
    if (!figure.ok) return figure;
    minutes += figure.value * minutesOf[found[2] ?? 'min'];
    rest = rest.slice(found[0].length).trim();
  }
  return { ok: true, minutes };
}

/** Writes minutes so that they are read back as they were: 45 min, 12 h, 2 d 4 h; parts of a minute only below an hour. */
export function durationText(minutes: number, typed: (figure: number) => string): string {
  if (!Number.isInteger(minutes) || minutes === 0) return `${typed(minutes)} min`;
  const parts = [
    [Math.floor(minutes / 1440), 'd'],
    [Math.floor((minutes % 1440) / 60), 'h'],
    [minutes % 60, 'min'],
  ] as const;
  return parts
    .filter(([figure]) => figure > 0)
    .map(([figure, unit]) => `${typed(figure)} ${unit}`)
    .join(' ');
}
