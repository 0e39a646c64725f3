import { Injectable, computed, inject } from '@angular/core';
import type { EstimateSettings, ExtraLine } from '#shared/estimates/settings';
import { Formats } from '../../core/formats/formats';
import { Words } from '../../core/formats/words';
import { newId } from '../../core/new-id';
import type { EditedCell, PastedCells } from '../../ui/table/figure-column';
import { UnfinishedEntries } from '../draft/unfinished-entries';
import { EstimateStore } from '../estimate-store';
import { extraCells, typedCell, type ExtraCell } from './extra-cells';
import type { ExtraRow, WrongCell } from './extra-columns';
import { PriceNames } from './price-names';
import { extraLinesOf, type UsualExtra } from './usual-extras';

type WrongCells = Readonly<Partial<Record<ExtraCell, WrongCell>>>;

const unfinishedKey = (id: string): string => `extra ${id}`;

const isCell = (key: string): key is ExtraCell => (extraCells as readonly string[]).includes(key);

/** The further lines of the open estimate: added, typed, put elsewhere, taken away. */
@Injectable()
export class ExtraLinesStore {
  private readonly store = inject(EstimateStore);
  private readonly unfinished = inject(UnfinishedEntries);
  private readonly formats = inject(Formats);
  private readonly words = inject(Words);
  private readonly names = inject(PriceNames);

  readonly lines = computed<readonly ExtraLine[]>(() => this.store.settings()?.extras ?? []);
  private readonly prices = computed(
    () => new Map((this.store.priced()?.price.lines ?? []).map(({ id, price_minor }) => [id, price_minor])),
  );
  readonly rows = computed<readonly ExtraRow[]>(() => {
    const ids = this.unfinished.ids();
    return this.lines().map((line) => ({
      line,
      place: this.placeOf(line),
      price_minor: this.prices().get(line.id),
      wrong: ids.has(unfinishedKey(line.id)) ? this.wrongOf(line.id) : {},
    }));
  });

  /** Puts the lines of a usual thing at the end; gives the id of the first. */
  add(usual: UsualExtra): string | undefined {
    const [card, settings] = [this.store.card(), this.store.settings() as EstimateSettings | undefined];
    if (!card || !settings) return undefined;
    const timberId = this.store.members().at(0)?.timberId;
    const added = extraLinesOf(usual, { card, taxCategoryId: settings.taxCategoryId, timberId });
    this.keep([...this.lines(), ...added]);
    return added.at(0)?.id;
  }

  replace(line: ExtraLine): void {
    this.keep(this.lines().map((one) => (one.id === line.id ? line : one)));
  }

  remove(id: string): void {
    this.unfinished.forget(unfinishedKey(id));
    this.keep(this.lines().filter((line) => line.id !== id));
  }

  /** One place up or down. */
  shift(id: string, by: -1 | 1): void {
    const lines = [...this.lines()];
    const from = lines.findIndex((line) => line.id === id);
    const to = from + by;
    if (from < 0 || to < 0 || to >= lines.length) return;
    [lines[from], lines[to]] = [lines[to], lines[from]];
    this.keep(lines);
  }

  type({ rowId, key, text }: EditedCell): void {
    const line = this.lines().find(({ id }) => id === rowId);
    if (line && isCell(key)) this.takeCell(line, key, text);
  }

  /** Cells of a spreadsheet fill the lines from here down; what is beyond the last makes further lines of its kind. */
  paste({ rowId, keys, lines: texts }: PastedCells): void {
    const first = this.lines().findIndex(({ id }) => id === rowId);
    const last = this.lines().at(-1);
    if (first < 0 || !last) return;
    const beyond = texts.slice(this.lines().length - first).map(() => ({ ...last, id: newId() }));
    if (beyond.length > 0) this.keep([...this.lines(), ...beyond]);
    texts.forEach((cells, down) => {
      const { id } = this.lines()[first + down];
      cells.forEach((text, across) => this.type({ rowId: id, key: keys.at(across) ?? '', text }));
    });
  }

  private takeCell(line: ExtraLine, cell: ExtraCell, text: string): void {
    const typed = typedCell(line, { cell, text }, this.formats.locale());
    const { [cell]: _before, ...others } = this.wrongOf(line.id);
    if (typed.ok) {
      this.wait(line.id, others);
      this.replace(typed.line);
    } else this.wait(line.id, { ...others, [cell]: { text, remark: this.words.say(typed.code, typed.values) } });
  }

  private wrongOf(id: string): WrongCells {
    return this.unfinished.of<WrongCells>(unfinishedKey(id)) ?? {};
  }

  private wait(id: string, wrong: WrongCells): void {
    if (Object.keys(wrong).length === 0) this.unfinished.forget(unfinishedKey(id));
    else this.unfinished.put(unfinishedKey(id), wrong);
  }

  private keep(extras: readonly ExtraLine[]): void {
    this.store.changeSettings({ extras });
  }

  private placeOf(line: ExtraLine): string {
    const members = new Map(this.store.members().map(({ id, name }) => [id, name]));
    const place = line.memberId === null ? '' : this.names.memberOf(members)(line.memberId);
    const alternative = this.store.settings()?.alternatives.find(({ id }) => id === line.alternativeId)?.name;
    return [place, alternative].filter(Boolean).join(', ');
  }
}
