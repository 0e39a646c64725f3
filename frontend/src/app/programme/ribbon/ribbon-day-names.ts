import type { Formats } from '../../core/formats/formats';
import type { RibbonMark } from './ribbon-marks';

/** The names of days, weeks and months at the head of a ribbon, each worded once. */
export class RibbonDayNames {
  private readonly known = new Map<string, string>();

  constructor(private readonly formats: Formats) {}

  of({ day, kind }: RibbonMark): string {
    const form = kind === 'month' ? 'month' : kind === 'week' || day.endsWith('-01') ? 'short' : 'weekday';
    const key = `${form} ${day}`;
    const name = this.known.get(key) ?? this.formats.day(day, form);
    this.known.set(key, name);
    return name;
  }
}
