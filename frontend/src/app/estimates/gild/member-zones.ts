import { Injectable, computed, inject, signal } from '@angular/core';
import type { ZoneFigures } from '#shared/estimates/figures';
import type { Zone } from '#shared/estimates/member';
import { priceByTheLeaf } from '#shared/leaf/leaf-totals';
import { minorOf } from '#shared/money/minor-of';
import { Formats } from '../../core/formats/formats';
import type { EditedCell } from '../../ui/table/figure-column';
import { EstimateStore } from '../estimate-store';
import { addZone } from '../measuring/add-zone';
import { memberForm } from '../members/member-form';
import { MemberSelection } from '../members/member-selection';
import type { ZoneRow } from './zone-row';
import { ZonesAside } from './zones-aside';

/** The zones of the selected member: what was entered, what it comes to, and what one does with them. */
@Injectable()
export class MemberZones {
  private readonly store = inject(EstimateStore);
  private readonly formats = inject(Formats);
  private readonly selection = inject(MemberSelection);
  private readonly aside = inject(ZonesAside);
  private readonly asked = signal<string | undefined>(undefined);

  readonly form = memberForm();
  readonly figures = computed(() =>
    this.store.figures()?.members.find(({ memberId }) => memberId === this.selection.member()?.id),
  );
  readonly rows = computed<readonly ZoneRow[]>(() =>
    (this.form.value<readonly Zone[]>('zones') ?? []).map((zone, index) => {
      const inSum = this.store.figures()?.zones.find(({ zoneId }) => zoneId === zone.id);
      const isAside = !inSum && zone.alternativeId !== null;
      const worked = isAside ? this.aside.of(zone) : inSum;
      return { zone, path: `zones.${index}`, worked, isAside, leaf_minor: this.leaf_minor(worked) };
    }),
  );
  /** The one that is open: the one chosen, else the first. */
  readonly chosen = computed(() => this.rows().find(({ zone }) => zone.id === this.asked()) ?? this.rows().at(0));

  choose(id: string | undefined): void {
    this.asked.set(id);
  }

  add(): void {
    this.choose(addZone(this.form, this.store.card()));
  }

  remove({ path }: ZoneRow): void {
    const index = Number(path.split('.').at(-1));
    this.form.remove('zones', index);
    this.choose((this.rows().at(index) ?? this.rows().at(-1))?.zone.id);
  }

  type({ rowId, text }: EditedCell): void {
    const row = this.rows().find(({ zone }) => zone.id === rowId);
    if (row) this.form.put(`${row.path}.name`, text);
  }

  /** Another build-up takes along what suits it: steps it offers, leaf where leaf is laid. */
  buildWith({ path, zone }: ZoneRow, buildUpId: string): void {
    const card = this.store.card();
    const buildUp = card?.buildUps.buildUps.find(({ id }) => id === buildUpId);
    if (!card || !buildUp) return;
    const takesLeaf = buildUp.steps.some(({ kind }) => kind === 'lay');
    const leafId = takesLeaf ? (zone.leafId ?? card.leaf.products.at(0)?.id ?? null) : null;
    const chosenStepIds = zone.chosenStepIds.filter((id) => buildUp.steps.some((step) => step.id === id));
    this.form.put(path, { ...zone, buildUpId, leafId, chosenStepIds });
  }

  private leaf_minor(worked: ZoneFigures | undefined): number | null {
    const product = this.store.card()?.leaf.products.find(({ id }) => id === worked?.leaf?.productId);
    if (!worked?.leaf || !product || !this.store.costed()) return null;
    return minorOf(priceByTheLeaf(product, worked.leaf.grossLeaves.likely), this.formats.currencyDigits());
  }
}
