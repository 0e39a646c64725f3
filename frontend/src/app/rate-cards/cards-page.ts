import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { rateCardStates, type RateCardSummary } from '#shared/rate-cards/rate-card-summary-schema';
import { Formats } from '../core/formats/formats';
import { PagedList } from '../core/lists/paged-list';
import { Session } from '../core/session/session';
import { EmptyState } from '../ui/page/empty-state';
import { PageHeader } from '../ui/page/page-header';
import { Skeleton } from '../ui/page/skeleton';
import { CardStateMark } from './card-state-mark';
import { RateCardCalls } from './rate-card-calls';
import { StartCopy } from './start-copy';

/** Drafts first, then what is to come, what is in force, and what was, the latest first. */
function inOrder(one: RateCardSummary, other: RateCardSummary): number {
  const byState = rateCardStates.indexOf(one.state) - rateCardStates.indexOf(other.state);
  return byState || (other.from ?? other.changedAt).localeCompare(one.from ?? one.changedAt);
}

/** The rate cards of the workshop: the one in force, those to come, drafts, and what was worked with before. */
@Component({
  selector: 'app-cards-page',
  imports: [CardStateMark, EmptyState, MatButton, PageHeader, RouterLink, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './cards-page.html',
  styleUrl: './cards-page.scss',
})
export class CardsPage {
  private readonly calls = inject(RateCardCalls);
  private readonly session = inject(Session);
  private readonly startCopy = inject(StartCopy);
  protected readonly formats = inject(Formats);

  protected readonly list = new PagedList<undefined, RateCardSummary>(signal(undefined), (_, cursor, abort) =>
    this.calls.list(cursor, abort),
  );
  protected readonly isOwner = computed(() => this.session.may('owner'));
  protected readonly isStarting = signal(false);
  protected readonly cards = computed(() => {
    const cards = [...this.list.items()].sort(inOrder);
    const names = new Map(cards.map(({ id, name }) => [id, name]));
    return cards.map((card) => ({ card, basedOn: names.get(card.basedOnId ?? '') ?? '', begins: this.begins(card) }));
  });
  protected readonly inForce = computed(() => this.list.items().find(({ state }) => state === 'in-force'));

  protected async start(cardId: string): Promise<void> {
    this.isStarting.set(true);
    await this.startCopy.of(cardId).finally(() => this.isStarting.set(false));
  }

  /** The start card has been in force since before there was a workshop. */
  private begins({ from }: RateCardSummary): string {
    if (from === null) return '';
    return from === '1970-01-01' ? $localize`the beginning` : this.formats.day(from);
  }
}
