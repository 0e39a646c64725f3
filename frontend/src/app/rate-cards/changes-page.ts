import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  resource,
  signal,
  untracked,
} from '@angular/core';
import { MatButton } from '@angular/material/button';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import { Formats } from '../core/formats/formats';
import { NOW } from '../core/now';
import { Session } from '../core/session/session';
import { EmptyState } from '../ui/page/empty-state';
import { Skeleton } from '../ui/page/skeleton';
import { CardSaving } from './card/card-saving';
import { CardStore } from './card/card-store';
import { CardEffectsStore } from './changes/card-effects-store';
import { DifferenceList } from './changes/difference-list';
import { EffectsTable } from './changes/effects-table';
import { PutInForceForm } from './changes/put-in-force-form';
import { RateCardCalls } from './rate-card-calls';

/** What a card changes: against the one in force line by line, and in the price of every open estimate. */
@Component({
  selector: 'app-changes-page',
  imports: [DifferenceList, EffectsTable, EmptyState, MatButton, PutInForceForm, Skeleton],
  providers: [CardEffectsStore],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './changes-page.html',
  styleUrl: './changes-page.scss',
})
export class ChangesPage {
  private readonly calls = inject(RateCardCalls);
  private readonly session = inject(Session);
  private readonly saving = inject(CardSaving);
  private readonly formats = inject(Formats);
  private readonly now = inject(NOW);
  protected readonly store = inject(CardStore);
  protected readonly effects = inject(CardEffectsStore);

  /** The day a draft would begin: it is compared with the card that is in force then. */
  protected readonly from = signal(dayOfInstant(this.now().getTime(), this.formats.timeZone()));
  /** The card as the server has it: both figures and differences are of what is kept. */
  private readonly kept = computed(
    () => {
      const card = this.store.summary();
      return card && { id: card.id, version: card.version };
    },
    { equal: (one, other) => one?.id === other?.id && one?.version === other?.version },
  );
  private readonly fetched = resource({
    params: () => {
      const kept = this.kept();
      return kept && { ...kept, from: this.from() };
    },
    loader: async ({ params, abortSignal }) => {
      const { against, differences } = await this.calls.differences(params.id, params.from, abortSignal);
      return { against, differences, before: (await this.calls.read(against.id, abortSignal)).content };
    },
  });
  protected readonly compared = computed(() => (this.fetched.hasValue() ? this.fetched.value() : undefined));
  protected readonly problem = computed(() => this.fetched.error()?.message ?? '');
  protected readonly isDraft = computed(() => this.store.summary()?.state === 'draft');
  protected readonly isOwner = computed(() => this.session.may('owner'));
  protected readonly workedAt = computed(() => {
    const workedAt = this.effects.known()?.workedAt;
    return workedAt ? `${this.formats.dayOf(workedAt, 'short')}, ${this.formats.time(workedAt)}` : '';
  });

  constructor() {
    void this.saving.flush();
    effect(() => {
      const card = this.kept();
      const mayAsk = this.isOwner() && this.isDraft();
      if (card) untracked(() => this.effects.show(card.id, mayAsk));
    });
  }

  protected again(): void {
    this.fetched.reload();
  }
}
