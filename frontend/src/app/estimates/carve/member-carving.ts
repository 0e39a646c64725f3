import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { OrnamentExtent } from '#shared/carving/ornament-use';
import type { Member } from '#shared/estimates/member';
import { gradeHours, HoursTable, OrnamentForm, OrnamentPicker, RunDrawing, stageHours } from '../../carving';
import { Formats } from '../../core/formats/formats';
import { smallScreen } from '../../ui/screen/small-screen';
import { EntryAt, type EntryChoice } from '../../ui/field/entry-at';
import { FigureTable } from '../../ui/table/figure-table';
import { EstimateStore } from '../estimate-store';
import { alternativeChoices } from '../places/alternative-choices';
import { memberAbout } from '../places/member-about';
import { MemberOrnaments } from './member-ornaments';
import { OrnamentColumns } from './ornament-columns';
import type { OrnamentRow } from './ornament-row';

type Run = Extract<OrnamentExtent, { way: 'run' }>;

/** The ornaments of one member: a dense table, the chosen one to scale with all its entries, and the hours by stage and grade. */
@Component({
  selector: 'app-member-carving',
  imports: [EntryAt, FigureTable, HoursTable, MatButton, OrnamentForm, OrnamentPicker, RunDrawing],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './member-carving.html',
  styleUrl: '../places/member-content.scss',
})
export class MemberCarving {
  private readonly formats = inject(Formats);
  private readonly ornamentColumns = inject(OrnamentColumns);
  private readonly isSmall = smallScreen();
  protected readonly store = inject(EstimateStore);
  protected readonly ornaments = inject(MemberOrnaments);

  readonly member = input.required<Member>();

  private readonly figures = computed(() =>
    this.store.figures()?.members.find(({ memberId }) => memberId === this.member().id),
  );
  protected readonly about = computed(() => memberAbout(this.member(), this.figures(), this.formats));
  protected readonly columns = computed(() =>
    this.ornamentColumns.of(this.store, this.isSmall(), (row, key) => this.ornaments.remark(row, key)),
  );
  protected readonly totals = computed(() => {
    const hours = this.figures()?.carving_hours;
    if (!hours) return undefined;
    return {
      ornament: this.member().name,
      hours: this.formats.number(hours.likely, 1, 1),
      range: this.ornamentColumns.between(hours),
    };
  });
  private readonly carvingRows = computed(() => this.figures()?.carvingRows ?? []);
  private readonly grades = computed(
    () => this.store.figures()?.grades.map(({ gradeId: id, name }) => ({ id, name })) ?? [],
  );
  protected readonly byStage = computed(() =>
    stageHours(this.carvingRows(), this.store.figures()?.carving.stages ?? [], this.grades()),
  );
  protected readonly byGrade = computed(() => gradeHours(this.carvingRows(), this.grades()));
  protected readonly zones = computed<readonly EntryChoice[]>(() =>
    this.ornaments.zones().map(({ id, name }) => ({ value: id, label: name })),
  );
  protected readonly alternatives = computed(() => alternativeChoices(this.store.settings()));
  /** As a list of one, so that another ornament is another form. */
  protected readonly chosen = computed(() => this.ornaments.rows().filter((row) => row === this.ornaments.chosen()));
  protected readonly rowId = ({ use }: OrnamentRow): string => use.id;

  protected runOf({
    use,
    worked,
  }: OrnamentRow): { run: Run; fit: NonNullable<typeof worked>['fit'] & object } | undefined {
    return use.extent.way === 'run' && worked?.fit ? { run: use.extent, fit: worked.fit } : undefined;
  }
}
