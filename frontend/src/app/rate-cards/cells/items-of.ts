import type { BuildUpStep, MaterialUse } from '#shared/buildups/buildup';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { ItemList } from '#shared/rate-cards/tables/card-table';
import type { CellPath } from '#shared/rate-cards/tables/cell-path';
import { valueAt } from '#shared/rate-cards/tables/value-at';

/** An item of the card that a cell may name. */
export interface NamedItem {
  readonly id: string;
  readonly name: string;
}

/** The steps after the one whose wait is entered; the way leads through its place among the steps. */
function laterSteps(content: RateCard, path: CellPath): readonly NamedItem[] {
  const place = path.indexOf('steps');
  const steps = valueAt(content, path.slice(0, place + 1)) as readonly BuildUpStep[] | undefined;
  return steps?.slice(Number(path[place + 1]) + 1) ?? [];
}

/** The items a cell may name, in the order of the card. */
export function itemsOf(list: ItemList, content: RateCard, path: CellPath): readonly NamedItem[] {
  switch (list) {
    case 'grade':
      return content.money.grades;
    case 'leaf':
      return content.leaf.products;
    case 'timber':
      return content.carving.timbers;
    case 'material':
      return content.buildUps.materials;
    case 'material-or-recipe': {
      const use = valueAt(content, path.slice(0, -1)) as MaterialUse | undefined;
      return use?.of === 'recipe' ? content.buildUps.recipes : content.buildUps.materials;
    }
    case 'later-step':
      return laterSteps(content, path);
    case 'tax':
      return content.money.taxCategories;
  }
}
