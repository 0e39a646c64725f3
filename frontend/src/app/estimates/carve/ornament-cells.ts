import { Injectable, inject } from '@angular/core';
import type { OrnamentExtent } from '#shared/carving/ornament-use';
import { decimalSign } from '#shared/units/decimal-sign';
import { parseArea } from '#shared/units/parse-area';
import { parseLength } from '#shared/units/parse-length';
import { parseNumber } from '#shared/units/parse-number';
import { fittingExtent, foundEntries, type CatalogueEntry } from '../../carving';
import { Formats } from '../../core/formats/formats';
import type { MemberForm } from '../members/member-form';

/** Where a cell of the table leads: the ornament's path in the form, and the run of its member. */
export interface OrnamentCell {
  readonly path: string;
  readonly key: string;
  readonly text: string;
  readonly catalogue: readonly CatalogueEntry[];
  readonly run_mm: number;
}

/** Puts what was typed in a cell of the table into the form, which says what is wrong with it. */
@Injectable({ providedIn: 'root' })
export class OrnamentCells {
  private readonly formats = inject(Formats);

  /** What is to be said of a text no entry takes; empty where one took it. */
  type(form: MemberForm, cell: OrnamentCell): string {
    if (cell.key === 'ornament') return this.typeName(form, cell);
    if (cell.key === 'size')
      this.set(form, `${cell.path}.size_mm`, cell.text.trim() === '' ? null : this.length(cell.text));
    if (cell.key === 'amount') this.typeAmount(form, cell);
    return '';
  }

  private typeName(form: MemberForm, { path, text, catalogue, run_mm }: OrnamentCell): string {
    const entry = foundEntries(catalogue, text).at(0);
    if (!entry || text.trim() === '') return $localize`The rate card has no such ornament.`;
    const extent = form.value<OrnamentExtent>(`${path}.extent`);
    if (extent) form.put(`${path}.extent`, fittingExtent(extent, entry.way, run_mm));
    if (entry.relief) this.set(form, `${path}.relief`, entry.relief);
    this.set(form, `${path}.ornamentId`, entry.id);
    return '';
  }

  private typeAmount(form: MemberForm, { path, text }: OrnamentCell): void {
    const way = form.value<OrnamentExtent['way']>(`${path}.extent.way`) ?? 'pieces';
    if (way === 'run') this.set(form, `${path}.extent.run_mm`, this.length(text));
    if (way === 'area') this.set(form, `${path}.extent.area_mm2`, this.area(text));
    if (way === 'pieces') this.set(form, `${path}.extent.count`, this.count(text));
  }

  private set(form: MemberForm, path: string, value: unknown): void {
    const control = form.control(path);
    control.markAsDirty();
    control.setValue(value);
  }

  private count(text: string): number {
    const parsed = parseNumber(text, this.formats.locale());
    return parsed.ok ? parsed.value : Number.NaN;
  }

  private length(shown: string) {
    const text = shown.replace(/^≈\s*/, '');
    const parsed = parseLength(text, {
      unit: this.formats.lengthUnit(),
      decimalSign: decimalSign(this.formats.locale()),
    });
    return { text, mm: parsed.ok ? parsed.mm : Number.NaN };
  }

  private area(text: string) {
    const parsed = parseArea(text, { unit: this.formats.lengthUnit(), locale: this.formats.locale() });
    return { text, mm2: parsed.ok ? parsed.mm2 : Number.NaN };
  }
}
