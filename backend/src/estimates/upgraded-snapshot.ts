import type { MeasuredWork } from '#shared/estimates/price/measured-work';
import type { ExtraLine } from '#shared/estimates/settings';
import type { Snapshot } from '#shared/estimates/snapshot';

interface Typed {
  readonly text: string;
}

/** What a quantity was reckoned from while a line took a single measure. */
interface SingleMeasure {
  readonly rule: MeasuredWork['rule'];
  readonly length: (Typed & { readonly mm: number }) | null;
  readonly girth: (Typed & { readonly mm: number }) | null;
  readonly area: (Typed & { readonly mm2: number }) | null;
  readonly sides: 1 | 2;
  readonly worth: number;
}

const isSingle = (measured: MeasuredWork | SingleMeasure): measured is SingleMeasure => !('measures' in measured);

function severalMeasures({ rule, length, girth, area, sides, worth }: SingleMeasure): MeasuredWork {
  const figures = { length_mm: length?.mm ?? null, girth_mm: girth?.mm ?? null, area_mm2: area?.mm2 ?? null };
  const texts = { length_mm: length?.text, girth_mm: girth?.text, area_mm2: area?.text };
  const typed = Object.entries(texts).flatMap(([name, text]) =>
    text === undefined ? [] : [[`measures.0.${name}`, text]],
  );
  return {
    rule,
    measures: [{ count: 1, ...figures, sides, worth }],
    typed: Object.fromEntries(typed) as MeasuredWork['typed'],
  };
}

function upgradedLine(line: ExtraLine): ExtraLine {
  if (line.kind !== 'paid-quantity' || !line.measured || !isSingle(line.measured)) return line;
  return { ...line, measured: severalMeasures(line.measured) };
}

/** A snapshot as the program reads it today, whenever it was frozen; what is kept stays as it is. */
export function upgradedSnapshot(snapshot: Snapshot): Snapshot {
  const { draft } = snapshot;
  const settings = { ...draft.settings, extras: draft.settings.extras.map(upgradedLine) };
  return { ...snapshot, draft: { ...draft, settings } };
}
