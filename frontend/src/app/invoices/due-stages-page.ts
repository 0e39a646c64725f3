import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { DueStage } from '#shared/invoices/due-stages-endpoints';
import { mayBeReached } from '#shared/invoices/may-be-reached';
import { Formats } from '../core/formats/formats';
import { PagedList } from '../core/lists/paged-list';
import { ListBody } from '../jobs';
import { EmptyState } from '../ui/page/empty-state';
import { claimName } from './claim-names';
import { InvoiceCalls } from './invoice-calls';
import { StageDrafting } from './stage-drafting';
import { workshopToday } from './workshop-today';

/** What can be invoiced across all jobs: what was reached or has a day by that day, then what waits for a milestone or for its share of the work. */
@Component({
  selector: 'app-due-stages-page',
  imports: [EmptyState, ListBody, MatButton, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [StageDrafting],
  templateUrl: './due-stages-page.html',
  styleUrl: './due-stages-page.scss',
})
export class DueStagesPage {
  private readonly calls = inject(InvoiceCalls);
  private readonly drafting = inject(StageDrafting);
  protected readonly formats = inject(Formats);
  private readonly today = workshopToday();

  protected readonly isBusy = this.drafting.isBusy;
  private readonly asked = computed(() => ({}));
  protected readonly list = new PagedList<object, DueStage>(this.asked, (_, cursor, signal) =>
    this.calls.dueStages(cursor, signal),
  );
  protected readonly rows = computed(() =>
    this.list.items().map((stage) => ({ stage, name: claimName(stage, this.formats), when: this.whenOf(stage) })),
  );

  protected isPast({ dueOn }: DueStage): boolean {
    return dueOn !== null && dueOn <= this.today();
  }

  protected async draft(stage: DueStage): Promise<void> {
    if (!(await this.drafting.draft(stage))) this.list.reload();
  }

  private whenOf(stage: DueStage): string {
    if (stage.isReached && stage.dueOn !== null) return this.reached(stage, this.formats.day(stage.dueOn));
    if (stage.dueOn !== null) return this.formats.day(stage.dueOn);
    if (!mayBeReached(stage)) return $localize`at any time`;
    return stage.claim.of === 'work' ? $localize`when it is reached` : $localize`when it is due back`;
  }

  private reached({ claim }: DueStage, day: string): string {
    return claim.of === 'work' ? $localize`reached ${day}:day:` : $localize`due back ${day}:day:`;
  }
}
