import { NgTemplateOutlet } from '@angular/common';
import {
  ChangeDetectionStrategy,
  Component,
  ElementRef,
  Injector,
  afterNextRender,
  afterRenderEffect,
  computed,
  effect,
  inject,
  input,
  signal,
  viewChild,
} from '@angular/core';
import { RouterLink } from '@angular/router';
import { firstCalls } from '#shared/client-page/first-calls';
import { addressOf } from '../core/api/address-of';
import { Formats } from '../core/formats/formats';
import { Words } from '../core/formats/words';
import { PageTitle } from '../core/routing/page-title';
import { Session } from '../core/session/session';
import { Skeleton } from '../ui/page/skeleton';
import { ClientFrame } from './client-frame';
import { ClientIssueRest } from './client-issue-rest';
import { ClientIssueStore } from './client-issue-store';
import { ClientRefused } from './client-refused';
import { ClientDecline, ClientReview } from './later-parts';

/** An estimate as its client reads it: the piece, the choices, the price, the terms, questions, and the answer. */
@Component({
  selector: 'app-client-issue-page',
  imports: [
    ClientDecline,
    ClientFrame,
    ClientIssueRest,
    ClientRefused,
    ClientReview,
    NgTemplateOutlet,
    RouterLink,
    Skeleton,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [ClientIssueStore],
  templateUrl: './client-issue-page.html',
  styleUrl: './client-issue-page.scss',
})
export class ClientIssuePage {
  protected readonly store = inject(ClientIssueStore);
  protected readonly formats = inject(Formats);
  protected readonly words = inject(Words);
  private readonly session = inject(Session);
  private readonly title = inject(PageTitle, { optional: true });
  private readonly injector = inject(Injector);
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);

  readonly issueId = input.required<string>();

  /** The last look or declining, which are here a moment after they were asked for. */
  private readonly answering = viewChild<unknown, ElementRef<HTMLElement>>('answering', { read: ElementRef });

  /** Reading it, looking at it for the last time, or declining it. */
  protected readonly step = signal<'reading' | 'reviewing' | 'declining'>('reading');
  protected readonly paper = computed(() =>
    addressOf(firstCalls.readClientPaper, {
      params: { issueId: this.issueId() },
      query: { choice: this.store.choice().join(',') },
    }),
  );
  /** What a variation changes, as the papers call it. */
  protected readonly varies = computed(() =>
    (this.store.issue()?.varies ?? []).map((one) => this.words.say('paper-varies-one', { ...one })).join('; '),
  );
  protected readonly underSum = computed(() => {
    const isTaxed = this.store.price()?.tax_minor !== 0;
    const programme = this.store.programme();
    if (!programme) return isTaxed ? $localize`tax included` : '';
    const day = this.formats.day(programme.offeredOn, 'short');
    return isTaxed ? $localize`tax included, ready by ${day}:day:` : $localize`ready by ${day}:day:`;
  });

  constructor() {
    effect(() => this.store.open(this.issueId()));
    effect(() => this.session.visit(this.store.issue()?.letterhead));
    afterRenderEffect(() => this.answering()?.nativeElement.querySelector('h1')?.focus());
    effect(() => {
      const issue = this.store.issue();
      if (issue) this.title?.name(issue.job.title);
    });
  }

  protected go(step: 'reading' | 'reviewing' | 'declining'): void {
    this.step.set(step);
    afterNextRender(() => this.toTheTop(), { injector: this.injector });
  }

  /** Back from the last look; meanwhile something may have been changed at the workshop. */
  protected back(): void {
    this.store.reload();
    this.go('reading');
  }

  private toTheTop(): void {
    globalThis.scrollTo?.(0, 0);
    this.host.nativeElement.querySelector<HTMLElement>(this.store.mayAnswer() ? 'h1' : '.answer')?.focus();
  }
}
