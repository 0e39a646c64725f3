import { ChangeDetectionStrategy, Component, Injector, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { Member } from '#shared/estimates/member';
import { runItems, runPath } from '../../carving';
import { Formats } from '../../core/formats/formats';
import { Notices } from '../../core/problems/notices';
import { type CarvedRow, LayPlanDrawing, type LaidZone } from '../../leaf';
import { Icon } from '../../ui/icon/icon';
import { FigureTable } from '../../ui/table/figure-table';
import { EstimateStore } from '../estimate-store';
import { memberAbout } from '../places/member-about';
import { smallScreen } from '../../ui/screen/small-screen';
import { MemberZones } from './member-zones';
import { ZoneColumns } from './zone-columns';
import { ZoneForm } from './zone-form';
import type { ZoneRow } from './zone-row';
import { ZoneSpread } from './zone-spread';

/** The zones of one member: a dense table, the lay plan to scale, and the chosen zone with all its entries. */
@Component({
  selector: 'app-member-gilding',
  imports: [FigureTable, Icon, LayPlanDrawing, MatButton, ZoneForm],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [ZoneSpread],
  templateUrl: './member-gilding.html',
  styleUrl: '../places/member-content.scss',
})
export class MemberGilding {
  private readonly formats = inject(Formats);
  private readonly notices = inject(Notices);
  private readonly injector = inject(Injector);
  private readonly zoneColumns = inject(ZoneColumns);
  private readonly spread = inject(ZoneSpread);
  private readonly isSmall = smallScreen();
  protected readonly store = inject(EstimateStore);
  protected readonly zones = inject(MemberZones);

  readonly member = input.required<Member>();

  protected readonly about = computed(() => memberAbout(this.member(), this.zones.figures(), this.formats));
  protected readonly columns = computed(() =>
    this.zoneColumns.of(this.store, this.isSmall(), ({ path }) => this.zones.form.message(`${path}.name`)),
  );
  protected readonly totals = computed(() =>
    this.zones.rows().length > 1 ? this.zoneColumns.totals(this.member().name, this.zones.rows()) : undefined,
  );
  /** As a list of one, so that another zone is another form. */
  protected readonly chosen = computed(() => this.zones.rows().filter((row) => row === this.zones.chosen()));
  protected readonly rowId = ({ zone }: ZoneRow): string => zone.id;

  /** Zones that take parts of the profile lie side by side; a share is laid over the whole and split. */
  private readonly drawnRows = computed(() => {
    const chosen = this.zones.chosen();
    if (chosen?.zone.take.way !== 'parts') return chosen ? [chosen] : [];
    const base = this.zones.rows().filter(({ zone }) => zone.take.way === 'parts');
    return base.filter(({ zone }) => zone.alternativeId === chosen.zone.alternativeId);
  });
  protected readonly laid = computed<readonly LaidZone[]>(() =>
    this.drawnRows().flatMap(({ worked }) => (worked?.leaf && worked.leaf.bands.length > 0 ? [worked.leaf] : [])),
  );
  /** Repeats along the member's own run stand beneath the plan, to its scale. */
  protected readonly carved = computed<readonly CarvedRow[]>(() => {
    const drawn = this.drawnRows().map(({ zone }) => zone.id);
    return this.member().ornaments.flatMap(({ id, ornamentId, extent, zoneId }) => {
      const fit = this.store.figures()?.uses.find(({ useId }) => useId === id)?.fit;
      if (extent.way !== 'run' || !fit || zoneId === null || !drawn.includes(zoneId)) return [];
      const [items, height_mm] = [runItems(extent, fit), fit.pitch_mm];
      const path = (top_mm: number, to_mm: number) => runPath({ ornamentId, items, top_mm, height_mm, to_mm });
      return [{ height_mm, path }];
    });
  });
  protected readonly note = computed(() => {
    const chosen = this.zones.chosen();
    const { take } = chosen?.zone ?? {};
    if (chosen?.worked?.leaf?.way === 'patches')
      return $localize`An area of the same size: patches fall as the carving lets them.`;
    if (take?.way !== 'share' || take.share_percent >= 100) return '';
    const share = this.formats.figure('percent', take.share_percent);
    return $localize`Laid over the whole member; ${share}:share: of it is this zone.`;
  });

  protected async layElsewhere(row: ZoneRow): Promise<void> {
    const { askForZones } = await import('./spread-dialog');
    const chosen = await askForZones(this.injector, { row, ...this.spread.question(row.zone) });
    if (!chosen || chosen.length === 0) return;
    this.spread.lay(row.zone, chosen);
    const count = this.formats.number(chosen.length, 0);
    this.notices.say($localize`Laid on ${count}:count: more.`, {
      label: $localize`Undo`,
      run: () => void this.store.undo(),
    });
  }
}
