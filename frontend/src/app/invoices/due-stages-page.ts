import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import type { DueStage } from '#shared/invoices/due-stages-endpoints';
import { Formats } from '../core/formats/formats';
import { PagedList } from '../core/lists/paged-list';
import { newId } from '../core/new-id';
import { Notices } from '../core/problems/notices';
import { ProblemError } from '../core/problems/problem-error';
import { ListBody } from '../jobs';
import { EmptyState } from '../ui/page/empty-state';
import { claimName } from './claim-names';
import { InvoiceCalls } from './invoice-calls';
import { workshopToday } from './workshop-today';

/** What can be invoiced across all jobs: what has a day by its day, then what waits for a milestone or for its share of the work. */
@Component({
  selector: 'app-due-stages-page',
  imports: [EmptyState, ListBody, MatButton, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './due-stages-page.html',
  styleUrl: './due-stages-page.scss',
})
export class DueStagesPage {
  private readonly calls = inject(InvoiceCalls);
  private readonly router = inject(Router);
  private readonly notices = inject(Notices);
  protected readonly formats = inject(Formats);
  private readonly today = workshopToday();

  protected readonly isBusy = signal(false);
  private readonly asked = computed(() => ({}));
  protected readonly list = new PagedList<object, DueStage>(this.asked, (_, cursor, signal) =>
    this.calls.dueStages(cursor, signal),
  );
  protected readonly rows = computed(() =>
    this.list.items().map((stage) => ({ stage, name: claimName(stage, this.formats), when: this.whenOf(stage) })),
  );
  /** Made once for each claim: a second press drafts nothing twice. */
  private readonly ids = new Map<string, string>();

  protected isPast({ dueOn }: DueStage): boolean {
    return dueOn !== null && dueOn <= this.today();
  }

  protected async draft({ jobId, issueId, claim }: DueStage): Promise<void> {
    if (this.isBusy()) return;
    this.isBusy.set(true);
    const key = JSON.stringify([issueId, claim]);
    const invoiceId = this.ids.get(key) ?? newId();
    this.ids.set(key, invoiceId);
    try {
      await this.calls.beginStage(jobId, { invoiceId, issueId, claim });
      await this.router.navigate(['/accounts/invoices', invoiceId]);
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      this.notices.complain(error.message);
      this.list.reload();
    } finally {
      this.isBusy.set(false);
    }
  }

  private whenOf(stage: DueStage): string {
    if (stage.dueOn !== null) return this.formats.day(stage.dueOn);
    if (stage.gross_minor < 0 || stage.claim.of === 'again') return $localize`at any time`;
    return stage.claim.of === 'work' ? $localize`when it is reached` : $localize`when it is due back`;
  }
}
