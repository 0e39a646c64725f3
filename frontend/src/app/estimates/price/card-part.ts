import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { lineDifferences } from '#shared/estimates/line-differences';
import type { RateCardSummary } from '#shared/rate-cards/rate-card-summary-schema';
import { Formats } from '../../core/formats/formats';
import { Notices } from '../../core/problems/notices';
import { ProblemError } from '../../core/problems/problem-error';
import { EstimateStore } from '../estimate-store';
import { CardsInUse, type CardChange } from './cards-in-use';
import { DifferenceTable } from './difference-table';

/** The card a workshop starts with is in force from the first day there is. */
const beginning = '1970-01-01';

/** The rate card the estimate is worked on; where a newer one is in force, what it would change, and taking it. */
@Component({
  selector: 'app-card-part',
  imports: [DifferenceTable, MatButton, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './card-part.html',
  styles: `
    :host {
      display: grid;
      gap: 20px;
      min-width: 0;
    }
  `,
})
export class CardPart {
  private readonly formats = inject(Formats);
  private readonly notices = inject(Notices);
  private readonly store = inject(EstimateStore);
  protected readonly cards = inject(CardsInUse);

  protected readonly change = signal<CardChange | undefined>(undefined);
  protected readonly isBusy = signal(false);
  protected readonly since = computed(() => {
    const from = this.cards.used()?.from;
    return from && from > beginning ? this.formats.day(from) : '';
  });
  protected readonly newerSince = computed(() => {
    const from = this.cards.newer()?.from;
    return from ? this.formats.day(from) : '';
  });
  protected readonly lines = computed(() => {
    const change = this.change();
    if (!change) return [];
    const memberNames = Object.fromEntries(this.store.members().map(({ id, name }) => [id, name]));
    const [before, after] = [change.before, change.after].map(({ price }) => ({ lines: price.lines, memberNames }));
    return lineDifferences(before, after);
  });
  protected readonly net = computed(() => {
    const [before, after] = [this.change()?.before.price.net_minor ?? 0, this.change()?.after.price.net_minor ?? 0];
    return [before, after].map((net_minor) => this.formats.money(net_minor));
  });

  protected async look(rateCardId: string): Promise<void> {
    await this.busily(async () => this.change.set(await this.cards.change(rateCardId)));
  }

  protected async take({ id, name }: RateCardSummary): Promise<void> {
    await this.busily(async () => {
      await this.store.takeCard(id);
      this.change.set(undefined);
      this.notices.say($localize`The estimate is worked on “${name}:card:” from now on.`, {
        label: $localize`Undo`,
        run: () => void this.store.undo(),
      });
    });
  }

  private async busily(work: () => Promise<void>): Promise<void> {
    if (this.isBusy()) return;
    this.isBusy.set(true);
    try {
      await work();
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      this.notices.complain(error.message);
    } finally {
      this.isBusy.set(false);
    }
  }
}
