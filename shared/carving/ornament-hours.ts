import type { CarvingCard } from '#shared/carving/carving-card';
import type { UseHours } from '#shared/carving/carving-result';
import type { CarvedUse } from '#shared/carving/carving-work';
import type { CarvingItem, Ornament } from '#shared/carving/ornament';
import type { LearntPieces } from '#shared/carving/learnt-pieces';
import { stageRows } from '#shared/carving/stage-rows';
import { itemFactors, ornamentFactors } from '#shared/carving/use-factors';
import type { UseQuantity } from '#shared/carving/use-quantity';
import { mapTriple, type Triple } from '#shared/units/triple';
import type { Finding } from '#shared/words/finding';
import type { Reason } from '#shared/words/reason';

const firstUnit = (named: Ornament | CarvingItem, list: 'ornaments' | 'items'): Reason => ({
  ...(named.way === 'piece' && named.reference_mm === null
    ? { code: 'carving-each', values: { ornament: named.name } }
    : // A run or an area without a reference goes by the 100 mm or the square decimetre.
      {
        code: `carving-first-${named.way}`,
        values: { ornament: named.name, reference_mm: named.reference_mm ?? 100 },
      }),
  figure: named.hours.likely,
  unit: 'hours',
  house: `carving.${list}.${named.id}.hours`,
});

const inAll = (hours: Triple): Reason => ({
  code: 'carving-hours',
  values: { low_hours: hours.low, high_hours: hours.high },
  figure: hours.likely,
  unit: 'hours',
});

const amount = (quantity: number): Reason => ({ code: 'carving-amount', values: {}, figure: quantity, unit: 'number' });

function countReason({ use, members }: CarvedUse, { quantity, fit }: UseQuantity, way: Ornament['way']): Reason {
  if (way !== 'piece') return amount(quantity);
  if (!fit) return { code: 'carving-pieces', values: { members }, figure: quantity, unit: 'pieces' };
  const runs = use.extent.way === 'run' ? use.extent.runs * members : members;
  return {
    code: 'carving-repeats',
    values: { free_mm: fit.free_mm, pitch_mm: fit.pitch_mm, runs },
    figure: quantity,
    unit: 'pieces',
  };
}

function stretchFindings({ use }: CarvedUse, { fit }: UseQuantity, card: CarvingCard): Finding[] {
  const stretch_percent = Math.abs(fit?.stretch ?? 0) * 100;
  if (stretch_percent <= card.stretchTolerance_percent) return [];
  const values = { stretch_percent, tolerance_percent: card.stretchTolerance_percent, pitch_mm: fit?.pitch_mm ?? 0 };
  return [{ kind: 'warn', code: 'carving-stretch-outside', values, about: use.id }];
}

function learningReasons(counted: UseQuantity, { learnt, group }: LearntPieces, card: CarvingCard): Reason[] {
  if (counted.quantity === 0) return [];
  const values = { pieces: group, rate_percent: card.learning.rate_percent, model: card.learning.model };
  return [
    { code: 'carving-learning', values, figure: learnt / counted.quantity, unit: 'factor', house: 'carving.learning' },
  ];
}

/** Hours of one repeated ornament: first-unit hours × factors × its share of the learning sum, divided into stages. */
export function ornamentHours(
  carved: CarvedUse,
  worked: { readonly ornament: Ornament; readonly counted: UseQuantity; readonly learning: LearntPieces | null },
  card: CarvingCard,
): UseHours {
  const { ornament, counted, learning } = worked;
  const factors = ornamentFactors(carved, ornament, card);
  const learnt = learning?.learnt ?? counted.quantity;
  const carving = mapTriple(ornament.hours, (hours) => hours * factors.factor * learnt);
  return {
    useId: carved.use.id,
    ornamentId: ornament.id,
    zoneId: carved.use.zoneId,
    quantity: counted.quantity,
    fit: counted.fit,
    factor: factors.factor,
    learnt,
    carving,
    rows: stageRows(carving, carved.use.isUndercut, card),
    reasons: [
      firstUnit(ornament, 'ornaments'),
      ...factors.reasons,
      countReason(carved, counted, ornament.way),
      ...(learning ? learningReasons(counted, learning, card) : []),
      inAll(carving),
    ],
    findings: [...factors.findings, ...counted.findings, ...stretchFindings(carved, counted, card)],
  };
}

/** Hours of an item of the card: its own hours × amount × factors, all to its own grade. */
export function itemHours(
  carved: CarvedUse,
  item: CarvingItem,
  worked: { readonly counted: UseQuantity; readonly card: CarvingCard },
): UseHours {
  const { counted, card } = worked;
  const factors = itemFactors(carved, item, card);
  const carving = mapTriple(item.hours, (hours) => hours * factors.factor * counted.quantity);
  return {
    useId: carved.use.id,
    ornamentId: item.id,
    zoneId: carved.use.zoneId,
    quantity: counted.quantity,
    fit: counted.fit,
    factor: factors.factor,
    learnt: counted.quantity,
    carving,
    rows: [{ kind: item.kind, stageId: '', gradeId: item.gradeId, hours: carving }],
    reasons: [firstUnit(item, 'items'), ...factors.reasons, countReason(carved, counted, item.way), inAll(carving)],
    findings: [...factors.findings, ...counted.findings],
  };
}
