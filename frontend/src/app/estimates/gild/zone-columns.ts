import { Injectable, inject } from '@angular/core';
import { laidAs } from '../../leaf';
import { Formats } from '../../core/formats/formats';
import { Words } from '../../core/formats/words';
import type { Explained } from '../../ui/figure/explained';
import type { FigureColumn } from '../../ui/table/figure-column';
import type { EstimateStore } from '../estimate-store';
import { explainedBy } from '../places/explained-by';
import type { ZoneRow } from './zone-row';

type Column = FigureColumn<ZoneRow>;

/** A zone of an alternative that is not chosen was not worked: its build-up is named by the card, or as another zone has it. */
function buildUpName({ zone, worked }: ZoneRow, store: EstimateStore): string {
  if (worked) return worked.buildUp;
  const known = store.card()?.buildUps.buildUps.find(({ id }) => id === zone.buildUpId)?.name;
  const alike = store.members().flatMap(({ zones }) => zones.filter(({ buildUpId }) => buildUpId === zone.buildUpId));
  const other = store.figures()?.zones.find(({ zoneId }) => alike.some(({ id }) => id === zoneId))?.buildUp;
  return known ?? other ?? '';
}

/** The columns of the zones of a member. */
@Injectable({ providedIn: 'root' })
export class ZoneColumns {
  readonly formats = inject(Formats);
  readonly words = inject(Words);

  /** `remark` says what is wrong with a name. */
  of(store: EstimateStore, isSmall: boolean, remark: (row: ZoneRow) => string): readonly Column[] {
    const name: Column = {
      key: 'name',
      heading: $localize`Zone`,
      kind: 'text',
      text: ({ zone }) => zone.name,
      minor: (row) => (isSmall ? this.small(row, store) : this.alternative(row, store)),
      editable: store.mayEdit(),
      remark,
    };
    const wide = [this.buildUp(store), this.laid(), this.area()];
    return [name, ...(isSmall ? [] : wide), this.leaves(), ...(store.costed() ? [this.money()] : [])];
  }

  /** How the leaves of a zone came about, to stand beside the table. */
  explained({ zone, worked }: ZoneRow): Explained | undefined {
    if (!worked?.leaf) return undefined;
    const leaves = this.formats.number(worked.leaf.grossLeaves.likely, 1, 1);
    const heading = $localize`${leaves}:leaves: leaves`;
    return explainedBy({ id: `leaf ${zone.id}`, heading, reasons: worked.leaf.reasons }, this);
  }

  /** The bottom line of a member. */
  totals(name: string, all: readonly ZoneRow[]): Record<string, string> {
    const rows = all.filter(({ isAside }) => !isAside);
    const sum = (pick: (row: ZoneRow) => number) => rows.reduce((total, row) => total + pick(row), 0);
    const leaves = sum(({ worked }) => worked?.leaf?.grossLeaves.likely ?? 0);
    return {
      name,
      area: this.areaText(sum(({ worked }) => worked?.true_mm2 ?? 0)),
      leaves: leaves > 0 ? this.formats.number(leaves, 1, 1) : '',
      money: leaves > 0 ? this.formats.amount(sum(({ leaf_minor }) => leaf_minor ?? 0)) : '',
    };
  }

  areaText(area_mm2: number): string {
    return this.formats.area(area_mm2);
  }

  private buildUp(store: EstimateStore): Column {
    return {
      key: 'buildUp',
      heading: $localize`Build-up`,
      kind: 'text',
      text: (row) => buildUpName(row, store),
    };
  }

  private laid(): Column {
    return {
      key: 'laid',
      heading: $localize`Laid as`,
      kind: 'chip',
      text: ({ worked }) => (worked ? (worked.leaf ? laidAs(worked.leaf) : $localize`no leaf`) : '–'),
    };
  }

  private area(): Column {
    return {
      key: 'area',
      heading: $localize`True surface`,
      kind: 'figure',
      text: ({ worked }) => (worked ? this.areaText(worked.true_mm2) : '–'),
      explained: ({ zone, worked }) =>
        worked &&
        explainedBy({ id: `zone ${zone.id}`, heading: this.areaText(worked.true_mm2), reasons: worked.reasons }, this),
    };
  }

  private leaves(): Column {
    return {
      key: 'leaves',
      heading: $localize`Leaves`,
      kind: 'figure',
      text: ({ worked }) => (worked?.leaf ? this.formats.number(worked.leaf.grossLeaves.likely, 1, 1) : '–'),
      explained: (row) => this.explained(row),
    };
  }

  private money(): Column {
    return {
      key: 'money',
      heading: $localize`Leaf, ${this.formats.currencySign()}:currency:`,
      kind: 'figure',
      text: ({ leaf_minor }) => (leaf_minor === null ? '' : this.formats.amount(leaf_minor)),
    };
  }

  /** What the columns of a phone leave out. */
  private small(row: ZoneRow, store: EstimateStore): string {
    const { worked } = row;
    const laid = worked?.leaf ? laidAs(worked.leaf) : '';
    const area = worked ? this.areaText(worked.true_mm2) : '';
    return [buildUpName(row, store), laid, area, this.alternative(row, store)].filter(Boolean).join(' · ');
  }

  private alternative({ zone, isAside }: ZoneRow, store: EstimateStore): string {
    const name = store.settings()?.alternatives.find(({ id }) => id === zone.alternativeId)?.name;
    if (!name) return '';
    return isAside
      ? $localize`in “${name}:alternative:”, figures with that choice, in no sum`
      : $localize`in “${name}:alternative:”`;
  }
}
