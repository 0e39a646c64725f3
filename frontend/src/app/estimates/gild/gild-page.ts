import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { gatheredFindings } from '../../drying';
import { FindingList } from '../../ui/page/finding-list';
import { EstimateStore } from '../estimate-store';
import { MemberSelection } from '../members/member-selection';
import { MemberPlace } from '../places/member-place';
import { PlaceExplanation } from '../places/place-explanation';
import { placeShowsWhole } from '../places/place-shows-whole';
import { MemberGilding } from './member-gilding';
import { MemberZones } from './member-zones';
import { WholeGilding } from './whole-gilding';
import { ZoneColumns } from './zone-columns';
import { ZoneSection } from './zone-section';
import { ZonesAside } from './zones-aside';

/** Gild: the zones of the selected member with their leaf and their build-up, or the leaf of the whole job. */
@Component({
  selector: 'app-gild-page',
  imports: [FindingList, MemberGilding, MemberPlace, WholeGilding, ZoneSection],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [PlaceExplanation, MemberZones, ZonesAside],
  template: `
    <app-member-place>
      @if (selection.shown(); as member) {
        <app-member-gilding [member]="member" />
      } @else {
        <app-whole-gilding />
      }
      <ng-container beside>
        @if (worked(); as zone) {
          <app-zone-section [zone]="zone" [timber]="timber()" />
        }
        <app-finding-list [findings]="findings()" />
      </ng-container>
    </app-member-place>
  `,
  styles: `
    :host {
      display: flex;
      flex: 1;
      min-width: 0;
    }
  `,
})
export class GildPage {
  private readonly store = inject(EstimateStore);
  private readonly zones = inject(MemberZones);
  private readonly zoneColumns = inject(ZoneColumns);
  protected readonly selection = inject(MemberSelection);

  private readonly chosen = computed(() => (this.selection.shown() ? this.zones.chosen() : undefined));
  protected readonly worked = computed(() => this.chosen()?.worked);
  protected readonly timber = computed(() => this.zones.figures()?.timber ?? '');
  /** What is to be told of the zone, or of the leaf of the whole job. */
  protected readonly findings = computed(() => {
    const all = this.store.figures()?.findings ?? [];
    const products = this.store.figures()?.leaf.map(({ productId }) => productId) ?? [];
    const about = this.chosen() ? [this.chosen()?.zone.id] : products;
    const own = all.filter((finding) => about.includes(finding.about));
    return gatheredFindings(own).map(({ finding }) => finding);
  });

  constructor() {
    placeShowsWhole();
    inject(PlaceExplanation).follow(() => {
      const row = this.chosen();
      return row && this.zoneColumns.explained(row);
    });
  }
}
