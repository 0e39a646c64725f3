import type { RatesSheet } from './rates-sheet';
import type { WorkbookFacts } from './workbook-facts';

/** The names of the figures that divide carving hours. */
export interface CarvingRates {
  /** Share of repeated carving that falls to a grade, over all its stages: a sum of names, or null where it has no stage. */
  readonly stages: (gradeId: string) => string | null;
  readonly undercut: string;
  readonly sharpening: string;
  readonly recutShare: Readonly<Record<'plain' | 'french', string>>;
  readonly recutHours: Readonly<Record<'plain' | 'french', string>>;
}

function stageShares(rates: RatesSheet, { snapshot, words }: WorkbookFacts): CarvingRates['stages'] {
  const { stages } = snapshot.card.carving;
  const { grades } = snapshot.card.money;
  const named = stages.map(({ id, name, share_hundredths, gradeId }) => {
    const grade = grades.find((one) => one.id === gradeId)?.name ?? gradeId;
    const label = words.say('sheet-stage', { stage: name, grade });
    return { gradeId, name: rates.rate({ label, value: share_hundredths / 100, unit: '%', name: ['stage', id] }) };
  });
  return (gradeId) => {
    const own = named.filter((stage) => stage.gradeId === gradeId).map(({ name }) => name);
    return own.length === 0 ? null : `(${own.join('+')})/100`;
  };
}

/** Writes the part of the card that divides carving hours into stages, and what is added to them. */
export function carvingRates(rates: RatesSheet, facts: WorkbookFacts): CarvingRates {
  const { words, snapshot } = facts;
  const { undercut_percent, sharpening_percent, recutting } = snapshot.card.carving;
  rates.part(words.say('sheet-carving'));
  const percent = (label: string, value: number, name: string) => rates.rate({ label, value, unit: '%', name: [name] });
  const perArea = (label: string, value: number, name: string) =>
    rates.rate({ label, value, unit: words.say('sheet-unit-hours-a-square-metre'), name: [name] });
  return {
    stages: stageShares(rates, facts),
    undercut: percent(words.say('sheet-undercut'), undercut_percent, 'undercut_percent'),
    sharpening: percent(words.say('sheet-sharpening'), sharpening_percent, 'sharpening_percent'),
    recutShare: {
      plain: percent(words.say('sheet-recut'), recutting.plain.share_percent, 'recut_percent'),
      french: percent(words.say('sheet-recut-french'), recutting.french.share_percent, 'recut_french_percent'),
    },
    recutHours: {
      plain: perArea(words.say('sheet-recut-bare'), recutting.plain.hours_per_m2, 'recut_hours_m2'),
      french: perArea(words.say('sheet-recut-french-bare'), recutting.french.hours_per_m2, 'recut_french_hours_m2'),
    },
  };
}
