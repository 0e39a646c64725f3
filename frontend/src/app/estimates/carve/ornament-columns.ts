import { Injectable, inject } from '@angular/core';
import type { Triple } from '#shared/units/triple';
import { planNames, RunWords } from '../../carving';
import { Formats } from '../../core/formats/formats';
import { Words } from '../../core/formats/words';
import { reliefNames } from '../../measure';
import type { Explained } from '../../ui/figure/explained';
import type { FigureColumn } from '../../ui/table/figure-column';
import type { EstimateStore } from '../estimate-store';
import { explainedBy } from '../places/explained-by';
import type { OrnamentRow } from './ornament-row';

type Column = FigureColumn<OrnamentRow>;

/** The columns of the ornaments of a member. */
@Injectable({ providedIn: 'root' })
export class OrnamentColumns {
  readonly formats = inject(Formats);
  readonly words = inject(Words);
  private readonly runWords = inject(RunWords);

  /** `remark` says what is wrong with a cell, by its row and key. */
  of(store: EstimateStore, isSmall: boolean, remark: (row: OrnamentRow, key: string) => string): readonly Column[] {
    const editable = store.mayEdit();
    const at = (key: string) => ({ key, editable, remark: (row: OrnamentRow) => remark(row, key) });
    const name: Column = {
      ...at('ornament'),
      heading: $localize`Ornament`,
      kind: 'text',
      text: (row) => row.name,
      minor: (row) => this.particulars(row, store),
    };
    const amount: Column = {
      ...at('amount'),
      heading: $localize`Amount`,
      kind: 'figure',
      text: ({ use }) => this.runWords.ofExtent(use.extent),
    };
    return [
      name,
      amount,
      ...(isSmall ? [] : [this.repeats(), this.size(at('size'))]),
      this.hours(),
      ...(isSmall ? [] : [this.range()]),
    ];
  }

  /** Low to high as it stands beside the likely hours. */
  between({ low, high }: Triple): string {
    const [from, to] = [low, high].map((hours) => this.formats.number(hours, 1, 1));
    return from === to ? '' : $localize`${from}:low: to ${to}:high:`;
  }

  explained({ use, worked }: OrnamentRow): Explained | undefined {
    if (!worked) return undefined;
    const heading = this.formats.figure('hours', worked.carving.likely);
    return explainedBy({ id: `use ${use.id}`, heading, reasons: worked.reasons }, this);
  }

  private repeats(): Column {
    return {
      key: 'repeats',
      heading: $localize`Repeats`,
      kind: 'text',
      text: ({ worked }) => this.repeatsOf(worked),
      minor: ({ worked }) => (worked?.fit ? this.runWords.ofStretch(worked.fit.stretch) : ''),
    };
  }

  private repeatsOf(worked: OrnamentRow['worked']): string {
    if (!worked?.fit) return '';
    const { repeats, pitch_mm } = worked.fit;
    return $localize`${this.formats.number(repeats, 0)}:count: of ${this.formats.length(pitch_mm)}:pitch:`;
  }

  private size(at: Pick<Column, 'key' | 'editable' | 'remark'>): Column {
    const text = ({ use }: OrnamentRow) => (use.size_mm === null ? '' : this.formats.length(use.size_mm));
    return { ...at, heading: $localize`Size`, kind: 'figure', text };
  }

  private hours(): Column {
    return {
      key: 'hours',
      heading: $localize`Hours`,
      kind: 'figure',
      text: ({ worked }) => (worked ? this.formats.number(worked.carving.likely, 1, 1) : '–'),
      explained: (row) => this.explained(row),
    };
  }

  private range(): Column {
    const text = ({ worked }: OrnamentRow) => (worked ? this.between(worked.carving) : '');
    return { key: 'range', heading: $localize`Low to high`, kind: 'figure', text };
  }

  /** What makes it dearer or cheaper: “high, undercut, flat sweep”. */
  private particulars({ use, hasRelief }: OrnamentRow, store: EstimateStore): string {
    const alternative = store.settings()?.alternatives.find(({ id }) => id === use.alternativeId)?.name ?? '';
    return [
      hasRelief ? reliefNames[use.relief].toLowerCase() : '',
      use.isUndercut ? $localize`undercut` : '',
      use.plan === 'straight' ? '' : planNames[use.plan].toLowerCase(),
      use.isMirrored ? $localize`other hand` : '',
      use.hasOwnPattern ? $localize`own pattern` : '',
      this.runWords.ofRest(use.extent),
      alternative && $localize`in “${alternative}:alternative:”`,
    ]
      .filter(Boolean)
      .join(', ');
  }
}
