import IntlMessageFormat from 'intl-messageformat';
import type { Catalogue, WordCode, WordValues } from '#shared/words/word-code';

/** How a reader wants figures written: their locale, units and currency. Made by `formatsFor` of `units`. */
export interface ValueFormats {
  readonly locale: string;
  /** `mm`, `mm2`, `minor`, `hours`, `minutes`, `percent`, `celsius` …: a figure with its unit, as text. */
  readonly write: (unit: string, figure: number) => string;
  /** What metric measures are to a reader of others: “ (10.76 ft²)”, to stand behind the name of one in any message. */
  readonly measures?: Partial<typeof noMeasures>;
}

/** Values every message may name without being given them; empty where the reader's own measures are metric. */
export const noMeasures = { ofMetre: '', ofSquareMetre: '', ofSquareDecimetre: '', ofCubicDecimetre: '' };

const messages = new Map<string, IntlMessageFormat>();

function messageFor(text: string, locale: string): IntlMessageFormat {
  const key = `${locale}\n${text}`;
  const known = messages.get(key);
  if (known) return known;
  const made = new IntlMessageFormat(text, locale, undefined, { ignoreTag: true });
  messages.set(key, made);
  return made;
}

/** A rate is money that keeps its decimals, so `rate_minor` is a unit by itself. */
const unitOf = (name: string): string | undefined => (name === 'rate_minor' ? name : /_([a-zµ0-9]+)$/.exec(name)?.[1]);

function written(values: WordValues, formats: ValueFormats): Record<string, string | number> {
  const out: Record<string, string | number> = { ...noMeasures, ...formats.measures };
  for (const [name, value] of Object.entries(values)) {
    const unit = unitOf(name);
    out[name] = typeof value === 'number' && unit ? formats.write(unit, value) : value;
    // A message for limits of every kind says `{maximum}`; the unit comes with the value.
    if (unit && unit !== name) out[name.slice(0, -unit.length - 1)] ??= out[name];
  }
  return out;
}

/** Words a code with its values in a language and a reader's formats; a value named `girth_mm` is written as a length, and so on; its message may call it `girth`. */
export function say(catalogue: Catalogue, formats: ValueFormats): (code: WordCode, values?: WordValues) => string {
  return (code, values = {}) => String(messageFor(catalogue[code], formats.locale).format(written(values, formats)));
}
