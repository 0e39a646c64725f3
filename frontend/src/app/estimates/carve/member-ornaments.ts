import { Injectable, computed, inject, signal } from '@angular/core';
import type { MemberOrnament, Zone } from '#shared/estimates/member';
import { ornamentRuns } from '#shared/measure/ornament-runs';
import { type CatalogueEntry, foundEntries, ornamentCatalogue } from '../../carving';
import { newId } from '../../core/new-id';
import type { EditedCell, MovedRow, PastedCells } from '../../ui/table/figure-column';
import { EstimateStore } from '../estimate-store';
import { memberForm } from '../members/member-form';
import { MemberSelection } from '../members/member-selection';
import { newOrnament } from './new-ornament';
import { OrnamentCells } from './ornament-cells';
import type { OrnamentRow } from './ornament-row';

/** The ornaments of the selected member: what was entered, what it comes to, and what one does with them. */
@Injectable()
export class MemberOrnaments {
  private readonly store = inject(EstimateStore);
  private readonly selection = inject(MemberSelection);
  private readonly cells = inject(OrnamentCells);
  private readonly remarks = signal<ReadonlyMap<string, string>>(new Map());
  private readonly asked = signal<string | undefined>(undefined);

  readonly form = memberForm();
  readonly catalogue = computed<readonly CatalogueEntry[]>(() => {
    const card = this.store.card();
    return card ? ornamentCatalogue(card.carving) : [];
  });
  readonly run_mm = computed(() => this.figures()?.run_mm ?? 0);
  readonly zones = computed<readonly Zone[]>(() => this.selection.member()?.zones ?? []);
  readonly rows = computed<readonly OrnamentRow[]>(() =>
    (this.form.value<readonly MemberOrnament[]>('ornaments') ?? []).map((use, index) => {
      const worked = this.store.figures()?.uses.find(({ useId }) => useId === use.id);
      const entry = this.catalogue().find(({ id }) => id === use.ornamentId);
      const name = entry?.name ?? worked?.ornament ?? use.ornamentId;
      return { use, path: `ornaments.${index}`, name, hasRelief: entry?.relief !== null, worked };
    }),
  );
  /** The one that is open below the table: the one chosen, else the first. */
  readonly chosen = computed(() => this.rows().find(({ use }) => use.id === this.asked()) ?? this.rows().at(0));

  choose(id: string | undefined): void {
    this.asked.set(id);
  }

  add(entry: CatalogueEntry): void {
    this.insert([entry]);
  }

  duplicate({ use, path }: OrnamentRow): void {
    const id = newId();
    this.form.insert('ornaments', indexOf(path) + 1, { ...use, id });
    this.choose(id);
  }

  remove({ path }: OrnamentRow): void {
    const index = indexOf(path);
    this.form.remove('ornaments', index);
    this.choose((this.rows().at(index) ?? this.rows().at(-1))?.use.id);
  }

  move({ rowId, from, to }: MovedRow): void {
    this.form.move('ornaments', from, to);
    this.choose(rowId);
  }

  type({ rowId, key, text }: EditedCell): void {
    const row = this.rows().find(({ use }) => use.id === rowId);
    if (!row) return;
    const cell = { path: row.path, key, text, catalogue: this.catalogue(), run_mm: this.run_mm() };
    const remark = this.cells.type(this.form, cell);
    this.remarks.update((remarks) => new Map([...remarks, [`${rowId} ${key}`, remark]]));
  }

  /** Lines of a spreadsheet: those that reach past the last ornament are new ones, where the card knows their names. */
  paste({ rowId, keys, lines }: PastedCells): void {
    const first = this.rows().findIndex(({ use }) => use.id === rowId);
    const missing = lines.slice(Math.max(0, this.rows().length - first));
    if (keys[0] === 'ornament')
      this.insert(missing.flatMap(([name = '']) => foundEntries(this.catalogue(), name).slice(0, 1)));
    lines.forEach((cells, offset) => {
      const row = this.rows().at(first + offset);
      cells.forEach((text, place) => row && this.type({ rowId: row.use.id, key: keys[place] ?? '', text }));
    });
  }

  /** What is wrong with a cell: what was typed there, else what the form says of its entry. */
  remark({ use, path }: OrnamentRow, key: string): string {
    const entries: Readonly<Record<string, readonly string[]>> = {
      ornament: ['ornamentId'],
      amount: ['extent.count', 'extent.run_mm', 'extent.area_mm2'],
      size: ['size_mm'],
    };
    const said = (entries[key] ?? []).map((entry) => this.form.message(`${path}.${entry}`));
    return (this.remarks().get(`${use.id} ${key}`) || said.find(Boolean)) ?? '';
  }

  private insert(entries: readonly CatalogueEntry[]): void {
    const member = this.selection.member();
    if (!member) return;
    const start = { along: ornamentRuns(member.shape), zoneIds: this.zones().map(({ id }) => id) };
    for (const entry of entries) {
      const id = newId();
      this.form.insert('ornaments', this.rows().length, newOrnament(entry, { id, ...start }));
      this.choose(id);
    }
  }

  private figures() {
    return this.store.figures()?.members.find(({ memberId }) => memberId === this.selection.member()?.id);
  }
}

const indexOf = (path: string): number => Number(path.split('.').at(-1));
