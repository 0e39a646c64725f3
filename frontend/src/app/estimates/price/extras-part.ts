import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Formats } from '../../core/formats/formats';
import { Notices } from '../../core/problems/notices';
import { Icon } from '../../ui/icon/icon';
import { StepButtons } from '../../ui/order/step-buttons';
import { EmptyState } from '../../ui/page/empty-state';
import { FindingList } from '../../ui/page/finding-list';
import { FigureTable } from '../../ui/table/figure-table';
import { EstimateStore } from '../estimate-store';
import { extraColumns, type ExtraRow } from './extra-columns';
import { ExtraLineForm } from './extra-line-form';
import { ExtraLinesStore } from './extra-lines-store';
import { usualExtraNames } from './extra-names';
import { smallScreen } from '../../ui/screen/small-screen';
import { usualExtras, type UsualExtra } from './usual-extras';

/** Further lines: work and goods no member carries, added from the card with one press and entered in a dense table. */
@Component({
  selector: 'app-extras-part',
  imports: [EmptyState, ExtraLineForm, FigureTable, FindingList, Icon, MatButton, StepButtons],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [ExtraLinesStore],
  templateUrl: './extras-part.html',
  styleUrl: './extras-part.scss',
})
export class ExtrasPart {
  private readonly formats = inject(Formats);
  private readonly store = inject(EstimateStore);
  private readonly notices = inject(Notices);
  private readonly isSmall = smallScreen();
  protected readonly lines = inject(ExtraLinesStore);

  protected readonly chosen = signal<string | undefined>(undefined);
  protected readonly usual = usualExtras.map((key) => ({ key, name: usualExtraNames[key] }));
  protected readonly columns = computed(() => extraColumns(this.formats, this.isSmall()));
  /** The chosen line, as a list of one, so that another line is another form. */
  protected readonly chosenLines = computed(() => this.lines.lines().filter(({ id }) => id === this.chosen()));
  /** What is to be told of a further line; choosing it opens the line. */
  protected readonly findings = computed(() => {
    const ids = new Set(this.lines.lines().map(({ id }) => id));
    return (this.store.costed()?.cost.findings ?? []).filter(({ about }) => about !== undefined && ids.has(about));
  });
  protected readonly rowId = ({ line }: ExtraRow): string => line.id;

  protected add(usual: UsualExtra): void {
    const id = this.lines.add(usual);
    if (id === undefined) return;
    this.chosen.set(id);
    this.offerUndo($localize`${usualExtraNames[usual]}:line: is added.`);
  }

  protected remove(id: string, name: string): void {
    const place = this.lines.lines().findIndex((line) => line.id === id);
    this.lines.remove(id);
    this.chosen.set((this.lines.lines().at(place) ?? this.lines.lines().at(-1))?.id);
    this.offerUndo($localize`${name}:line: is removed.`);
  }

  private offerUndo(text: string): void {
    this.notices.say(text, { label: $localize`Undo`, run: () => void this.store.undo() });
  }
}
