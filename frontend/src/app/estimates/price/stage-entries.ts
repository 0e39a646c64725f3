import type { Stage } from '#shared/estimates/settings';
import { D } from '#shared/money/decimal';
import { formatDecimal } from '#shared/units/format-decimal';
import { parseNumber } from '#shared/units/parse-number';
import type { WordCode, WordValues } from '#shared/words/word-code';

/** One stage as it is typed: the share as text, until all of them come to 100 %. */
export interface StageEntry {
  readonly id: string;
  readonly name: string;
  readonly share: string;
}

/** What typed stages come to: the stages, or what is wrong and how much is missing (negative: too much), in percent. */
export interface ReadStages {
  readonly stages: readonly Stage[] | undefined;
  readonly missing_percent: string | undefined;
  readonly remarks: ReadonlyMap<string, { readonly code: WordCode; readonly values: WordValues }>;
}

type Remark = readonly [string, { code: WordCode; values: WordValues }];

export const stageEntriesOf = (stages: readonly Stage[], locale: string): StageEntry[] =>
  stages.map(({ id, name, percent }) => ({ id, name, share: formatDecimal(String(percent), locale) }));

function readShare(share: string, locale: string) {
  const parsed = parseNumber(share.replace(/\s*%\s*$/, ''), locale);
  if (!parsed.ok) return parsed;
  const isShare = new D(parsed.decimal).greaterThanOrEqualTo(0) && new D(parsed.decimal).lessThanOrEqualTo(100);
  return isShare ? parsed : { ok: false as const, code: 'entry-not-offered' as const, values: {} };
}

/** Reads typed stages; they are kept only when every one is named and together they are exactly 100 %, or there is none. */
export function readStages(entries: readonly StageEntry[], locale: string): ReadStages {
  const read = entries.map((entry) => ({ entry, share: readShare(entry.share, locale) }));
  const remarks = read.flatMap(({ entry, share }): Remark[] => {
    const unnamed: Remark[] =
      entry.name.trim() === '' ? [[`${entry.id} name`, { code: 'entry-missing', values: {} }]] : [];
    return share.ok ? unnamed : [...unnamed, [`${entry.id} share`, { code: share.code, values: share.values }]];
  });
  const sum = read.reduce((total, { share }) => (share.ok ? total.plus(share.decimal) : total), new D(0));
  const isWhole = entries.length === 0 || sum.equals(100);
  const stages = read.map(({ entry, share }) => ({
    id: entry.id,
    name: entry.name.trim(),
    percent: share.ok ? share.value : 0,
  }));
  return {
    stages: isWhole && remarks.length === 0 ? stages : undefined,
    missing_percent: isWhole ? undefined : new D(100).minus(sum).toFixed(),
    remarks: new Map(remarks),
  };
}
