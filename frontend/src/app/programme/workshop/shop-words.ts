import type { DayHours } from '#shared/programme/shop-calendar';
import type { ShopAnswer, ShopContent } from '#shared/programme/shop-schema';
import type { Formats } from '../../core/formats/formats';
import { hoursText } from './hours-text';
import { weekdayNames } from './weekday-names';

/** What lines of the workshop's own data are called. */
const lineNames: Readonly<Record<string, string>> = {
  hours: $localize`Hours`,
  productiveShare_percent: $localize`Productive share of the hours, %`,
  overtime_percent: $localize`Overtime costs more, %`,
  climates: $localize`Air by month`,
  days: $localize`Closed and extra days`,
  people: $localize`People`,
  places: $localize`Racks and benches`,
  absences: $localize`Absences`,
  name: $localize`Name`,
  firstDay: $localize`From`,
  lastDay: $localize`To`,
  note: $localize`Note`,
  kind: $localize`What it is`,
  capacity: $localize`How many`,
  gradeIds: $localize`What they can do`,
  membershipId: $localize`Whose sign-in it is`,
};
const kindNames: Readonly<Record<string, string>> = {
  rack: $localize`for lots to dry on`,
  bench: $localize`to carve at`,
};

const isDayHours = (value: unknown): value is DayHours =>
  Array.isArray(value) && value.every((one) => typeof one === 'object' && one !== null && 'start_minutes' in one);

const isItem = (value: unknown): value is { readonly id: string; readonly name?: string; readonly firstDay?: string } =>
  typeof value === 'object' && value !== null && 'id' in value;

/** Says lines of the workshop's own data: what they are called, and how a value of them reads. */
export class ShopWords {
  constructor(
    private readonly formats: Formats,
    private readonly answer: Pick<ShopAnswer, 'grades' | 'memberships'>,
  ) {}

  /** The name of a line: “People, Ada, Hours”. Items go by their names in either side. */
  name(path: readonly string[], sides: readonly ShopContent[]): string {
    return path
      .map(
        (part, at) =>
          lineNames[part] ?? (part === '*' ? $localize`order` : this.itemName(path.slice(0, at + 1), sides)),
      )
      .filter(Boolean)
      .join(', ');
  }

  value(field: string, value: unknown): string {
    if (value === undefined) return $localize`removed`;
    if (field === 'hours') return this.hours(value);
    if (field === 'climates') return this.climates(value as ShopContent['climates']);
    if (field === 'gradeIds') return (value as string[]).map((id) => this.named(this.answer.grades, id)).join(', ');
    if (field === 'membershipId')
      return value === null ? $localize`nobody’s` : this.named(this.answer.memberships, value);
    if (field === 'firstDay' || field === 'lastDay') return this.day(value);
    if (isItem(value)) return this.wholeItem(value);
    if (typeof value === 'number') return this.formats.number(value, 2);
    return typeof value === 'string' ? (kindNames[value] ?? value) : '–';
  }

  /** Items in the order of one side. */
  order(list: unknown): string {
    return (Array.isArray(list) ? list.filter(isItem) : []).map((item) => this.wholeItem(item)).join(', ');
  }

  private itemName(path: readonly string[], sides: readonly ShopContent[]): string {
    const item = sides.map((side) => valueAt(side, path)).find(isItem);
    return item ? this.wholeItem(item) : '';
  }

  private wholeItem({ name, firstDay }: { readonly name?: string; readonly firstDay?: string }): string {
    return name || (firstDay ? this.day(firstDay) : '–');
  }

  private hours(value: unknown): string {
    if (value === null) return $localize`The workshop’s hours`;
    if (isDayHours(value)) return hoursText(value) || $localize`closed`;
    return (value as DayHours[])
      .map((hours, day) => `${weekdayNames[day]} ${hoursText(hours) || $localize`closed`}`)
      .join('\n');
  }

  private climates(months: ShopContent['climates']): string {
    if (months.length === 0) return $localize`the air of each estimate`;
    const air = ({ temperature_celsius: warm, humidity_percent: damp }: (typeof months)[number]) =>
      `${this.formats.figure('celsius', warm)} ${this.formats.figure('percent', damp)}`;
    return months.map(air).join(' · ');
  }

  private day(value: unknown): string {
    return typeof value === 'string' && value !== '' ? this.formats.day(value, 'full') : '–';
  }

  private named(all: readonly { readonly id: string; readonly name: string }[], id: unknown): string {
    return all.find((one) => one.id === id)?.name ?? String(id);
  }
}

/** What stands at a path of fields and ids. */
export function valueAt(value: unknown, path: readonly string[]): unknown {
  return path.reduce<unknown>((within, part) => {
    if (Array.isArray(within)) return (within as { readonly id?: string }[]).find(({ id }) => id === part);
    return typeof within === 'object' && within !== null ? (within as Record<string, unknown>)[part] : undefined;
  }, value);
}
