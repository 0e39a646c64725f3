import type { MaterialUse, StepWork } from '#shared/buildups/buildup';
import type { RecipePart } from '#shared/buildups/buildup-card';
import type { LeafProduct } from '#shared/leaf/leaf-product';
import type { Overhead } from '#shared/rate-cards/money-card';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { CellPath } from '#shared/rate-cards/tables/cell-path';
import { valueAt, withValueAt } from '#shared/rate-cards/tables/value-at';

/** Where the time of a step goes by something else, the figures of the way before have no meaning. */
function workOf(way: StepWork['way']): StepWork {
  switch (way) {
    case 'area':
      return { way, hours_m2: 0, factors: 'finish' };
    case 'laying':
      return { way, part: 'first' };
    default:
      return { way };
  }
}

function useOf({ of, itemId, loss_percent, share }: MaterialUse, way: MaterialUse['way']): MaterialUse {
  const taken = { of, itemId, loss_percent, share };
  switch (way) {
    case 'grams':
      return { way, grams_m2: 0, ...taken };
    case 'coverage':
      return { way, coverage_m2_L: 10, ...taken };
    case 'litres':
      return { way, litres_m2: 0, ...taken };
  }
}

const overheadOf = (way: Overhead['way']): Overhead =>
  way === 'per-hour' ? { way, perHour: '0' } : { way, percent: '0' };

/** What stands round a cell when it is another: a use takes the first of the other list, water has no material. */
function others(content: RateCard, path: CellPath, value: unknown): object | undefined {
  const holder = valueAt(content, path.slice(0, -1));
  const { materials, recipes } = content.buildUps;
  const shape = path.filter((part) => typeof part === 'string').join('.');
  if (shape.endsWith('work.way')) return workOf(value as StepWork['way']);
  if (shape === 'money.overhead.way') return overheadOf(value as Overhead['way']);
  if (shape.endsWith('uses.way')) return useOf(holder as MaterialUse, value as MaterialUse['way']);
  if (shape.endsWith('uses.of')) {
    const itemId = (value === 'recipe' ? recipes : materials)[0]?.id ?? '';
    return { ...(holder as MaterialUse), of: value, itemId };
  }
  if (shape === 'buildUps.recipes.parts.role') {
    const part = holder as RecipePart;
    return {
      ...part,
      role: value,
      materialId: value === 'water' ? null : (part.materialId ?? materials[0]?.id ?? null),
    };
  }
  if (shape === 'leaf.products.form' && value !== 'ribbon')
    return { ...(holder as LeafProduct), form: value, ribbon_mm: null };
  return undefined;
}

/** The card with another value in a cell, and with what follows from it in the cells beside it. */
export function withCell(content: RateCard, path: CellPath, value: unknown): RateCard {
  const holder = others(content, path, value);
  return holder ? withValueAt(content, path.slice(0, -1), holder) : withValueAt(content, path, value);
}
