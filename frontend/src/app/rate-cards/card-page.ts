import { ChangeDetectionStrategy, Component, computed, effect, inject, input, signal } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { MatButton, MatIconButton } from '@angular/material/button';
import { MatMenuModule } from '@angular/material/menu';
import { NavigationEnd, Router, RouterLink, RouterLinkActive, RouterOutlet } from '@angular/router';
import { filter, map } from 'rxjs';
import { cardParts } from '#shared/rate-cards/tables/card-parts';
import { Formats } from '../core/formats/formats';
import { Words } from '../core/formats/words';
import { Notices } from '../core/problems/notices';
import { Session } from '../core/session/session';
import { Confirm } from '../ui/dialog/confirm';
import { Icon } from '../ui/icon/icon';
import { EmptyState } from '../ui/page/empty-state';
import { PageHeader } from '../ui/page/page-header';
import { SavingIndicator } from '../ui/page/saving-indicator';
import { Skeleton } from '../ui/page/skeleton';
import { UndoButtons } from '../ui/page/undo-buttons';
import { CardConflict } from './card/card-conflict';
import { CardNameForm } from './card/card-name-form';
import { CardSaving } from './card/card-saving';
import { CardStore } from './card/card-store';
import { WorkbookEntry } from './card/workbook-entry';
import { CardStateMark } from './card-state-mark';
import { RateCardCalls } from './rate-card-calls';
import { StartCopy } from './start-copy';

/** A rate card with its parts at its side; a draft is edited here and saves itself. */
@Component({
  selector: 'app-card-page',
  imports: [
    ...[CardConflict, CardNameForm, CardStateMark, EmptyState, Icon, MatButton, MatIconButton, MatMenuModule],
    ...[PageHeader, RouterLink, RouterLinkActive, RouterOutlet, SavingIndicator, Skeleton, UndoButtons, WorkbookEntry],
  ],
  providers: [CardStore, CardSaving],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './card-page.html',
  styleUrl: './card-page.scss',
  host: { '(document:keydown)': 'press($event)' },
})
export class CardPage {
  private readonly calls = inject(RateCardCalls);
  private readonly router = inject(Router);
  private readonly session = inject(Session);
  private readonly words = inject(Words);
  private readonly formats = inject(Formats);
  private readonly confirm = inject(Confirm);
  private readonly notices = inject(Notices);
  private readonly startCopy = inject(StartCopy);
  protected readonly store = inject(CardStore);
  protected readonly saving = inject(CardSaving);

  readonly cardId = input.required<string>();

  private readonly url = toSignal(
    this.router.events.pipe(
      filter((event) => event instanceof NavigationEnd),
      map(() => this.router.url),
    ),
    { initialValue: this.router.url },
  );
  protected readonly isOnChanges = computed(() => this.url().split(/[?#]/)[0].endsWith('/changes'));
  protected readonly isOwner = computed(() => this.session.may('owner'));
  /** The card the workshop was founded with, which nobody has gone through. */
  protected readonly isFounding = computed(() => this.store.summary()?.basedOnId === null);
  protected readonly currency = this.formats.currency;
  protected readonly isRenaming = signal(false);
  protected readonly isFilling = signal(false);
  protected readonly about = computed(() => {
    const card = this.store.summary();
    if (!card?.from || card.from === '1970-01-01') return '';
    const day = this.formats.day(card.from);
    return $localize`from ${day}:day:`;
  });
  protected readonly parts = computed(() =>
    cardParts.map(({ id, heading }) => ({
      id,
      name: this.words.say(heading),
      toLookAt: this.store.remarks().countIn(id),
    })),
  );

  constructor() {
    effect(() => this.store.open(this.cardId()));
  }

  /** Undo and redo by their keys, but not while somebody types: there they belong to the entry. */
  protected press(event: KeyboardEvent): void {
    const isTyping = event.target instanceof HTMLElement && event.target.matches('input, textarea, select');
    if (isTyping || !(event.ctrlKey || event.metaKey) || event.key.toLowerCase() !== 'z') return;
    event.preventDefault();
    if (event.shiftKey) this.store.redo();
    else this.store.undo();
  }

  /** On a phone the parts go past the edge of the screen; the open one comes into view. */
  protected show(isOpen: boolean, link: HTMLElement): void {
    if (isOpen) link.scrollIntoView?.({ block: 'nearest', inline: 'center' });
  }

  protected async copy(): Promise<void> {
    if (await this.saving.flush()) await this.startCopy.of(this.cardId());
  }

  protected async download(): Promise<void> {
    if (!(await this.saving.flush())) return this.notices.complain(notKept);
    const link = document.createElement('a');
    link.href = URL.createObjectURL(await this.calls.workbook(this.cardId()));
    link.download = `${this.store.summary()?.name ?? ''}.xlsx`;
    link.click();
    URL.revokeObjectURL(link.href);
  }

  protected async takeBack(): Promise<void> {
    const card = this.store.summary();
    if (!card) return;
    this.store.tell(await this.calls.takeBack(card));
    this.store.reload();
  }

  protected async remove(): Promise<void> {
    const card = this.store.summary();
    const isSure = await this.confirm.ask({
      heading: $localize`Remove this draft?`,
      text: $localize`Everything entered in it is lost. Cards in force stay as they are.`,
      yes: $localize`Remove it`,
    });
    if (!card || !isSure) return;
    await this.calls.remove(card);
    await this.router.navigate(['/rates']);
  }
}

const notKept = $localize`The card is not kept yet; look at the entries marked first.`;
