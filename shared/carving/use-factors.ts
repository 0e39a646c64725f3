import type { CarvingCard } from '#shared/carving/carving-card';
import type { CarvedUse } from '#shared/carving/carving-work';
import type { CarvingItem, Ornament } from '#shared/carving/ornament';
import { sizeFactor } from '#shared/carving/size-factor';
import type { Finding } from '#shared/words/finding';
import type { Reason } from '#shared/words/reason';

/** What the hours of the card are multiplied with, as a whole and one by one. */
export interface UseFactors {
  readonly factor: number;
  readonly reasons: readonly Reason[];
  readonly findings: readonly Finding[];
}

const none: UseFactors = { factor: 1, reasons: [], findings: [] };

const one = (reason: Reason & { readonly figure: number }, findings: readonly Finding[] = []): UseFactors => ({
  factor: reason.figure,
  reasons: [reason],
  findings,
});

const together = (factors: readonly UseFactors[]): UseFactors => ({
  factor: factors.reduce((product, next) => product * next.factor, 1),
  reasons: factors.flatMap((next) => next.reasons),
  findings: factors.flatMap((next) => next.findings),
});

function ofSize({ use }: CarvedUse, reference_mm: number, card: CarvingCard): UseFactors {
  const size_mm = use.size_mm ?? reference_mm;
  const { factor, isTrusted } = sizeFactor(size_mm, reference_mm, card.sizeExponent);
  const values = { size_mm, reference_mm };
  const outside: Finding = { kind: 'warn', code: 'carving-size-outside', values, about: use.id };
  return one(
    { code: 'carving-size', values, figure: factor, unit: 'factor', house: 'carving.sizeExponent' },
    isTrusted ? [] : [outside],
  );
}

function ofTimber({ use, timberId }: CarvedUse, card: CarvingCard): UseFactors {
  const timber = card.timbers.find((known) => known.id === timberId);
  if (!timber) {
    return {
      ...none,
      findings: [{ kind: 'missing', code: 'carving-timber-unknown', values: { timber: timberId }, about: use.id }],
    };
  }
  const house = `carving.timbers.${timber.id}.factor`;
  return one({ code: 'carving-timber', values: { timber: timber.name }, figure: timber.factor, unit: 'factor', house });
}

// Hours of the card hold at the ornament's own relief, so what counts is the ratio of the two.
function ofRelief({ use }: CarvedUse, ornament: Ornament, card: CarvingCard): UseFactors {
  const figure = card.reliefFactors[use.relief] / card.reliefFactors[ornament.relief];
  const values = { relief: use.relief, reference: ornament.relief };
  return one({ code: 'carving-relief', values, figure, unit: 'factor', house: 'carving.reliefFactors' });
}

function ofUndercut({ use }: CarvedUse, card: CarvingCard): UseFactors {
  if (!use.isUndercut) return none;
  const figure = 1 + card.undercut_percent / 100;
  return one({ code: 'carving-undercut', values: {}, figure, unit: 'factor', house: 'carving.undercut_percent' });
}

function ofPlan({ use }: CarvedUse, card: CarvingCard, house: 'planFactors' | 'blankPlanFactors'): UseFactors {
  const figure = card[house][use.plan];
  if (figure === 1) return none;
  return one({ code: 'carving-plan', values: { plan: use.plan }, figure, unit: 'factor', house: `carving.${house}` });
}

/** Size (pieces alone), timber, relief asked ÷ reference, undercut and plan curvature of a repeated ornament. */
export const ornamentFactors = (carved: CarvedUse, ornament: Ornament, card: CarvingCard): UseFactors =>
  together([
    ornament.way === 'piece' ? ofSize(carved, ornament.reference_mm, card) : none,
    ofTimber(carved, card),
    ofRelief(carved, ornament, card),
    ofUndercut(carved, card),
    ofPlan(carved, card, 'planFactors'),
  ]);

/** Size where the item has a reference, timber, and the plan of the blank when it is shaped; nothing for once-only work. */
export function itemFactors(carved: CarvedUse, item: CarvingItem, card: CarvingCard): UseFactors {
  if (item.kind === 'once') return none;
  return together([
    item.way === 'piece' && item.reference_mm !== null ? ofSize(carved, item.reference_mm, card) : none,
    ofTimber(carved, card),
    item.kind === 'shaping' ? ofPlan(carved, card, 'blankPlanFactors') : none,
  ]);
}
