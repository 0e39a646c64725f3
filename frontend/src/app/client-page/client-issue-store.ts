import { Injectable, computed, inject, linkedSignal, resource, signal } from '@angular/core';
import type { ClientDecision, ClientIssue } from '#shared/client-page/client-issue-schema';
import type { Question } from '#shared/agreements/question-schema';
import { Api } from '../core/api/api';
import { openingCalls } from './opening-calls';

/** How many parts of an issue come one after the other below its head: of its pieces one member and those after it, the choices, and so on. */
export const partsOfIssue = 7;

/** An issue a client reads, what they chose of it, and what that comes to. */
@Injectable()
export class ClientIssueStore {
  private readonly api = inject(Api);
  private readonly issueId = signal<string | undefined>(undefined);

  private readonly reading = resource({
    params: () => this.issueId(),
    loader: ({ params, abortSignal }) =>
      this.api.call(openingCalls.readIssue, { params: { issueId: params }, signal: abortSignal }),
  });
  readonly issue = computed(() => (this.reading.hasValue() ? this.reading.value() : undefined));
  readonly problem = computed(() => this.reading.error()?.message ?? '');
  readonly mayAnswer = computed(() => this.issue()?.issue.state === 'open');

  /** What was decided, or else the base until the client chooses; a question asked meanwhile leaves the choice alone. */
  private readonly chosen = linkedSignal<ClientIssue | undefined, readonly string[]>({
    source: this.issue,
    computation: (issue, before): readonly string[] => {
      if (issue?.decision) return issue.decision.choice;
      return issue && before?.source?.issue.id === issue.issue.id ? before.value : [];
    },
  });
  readonly choice = this.chosen.asReadonly();

  /** How many parts below the head are shown. */
  readonly shown = signal(1);

  /** The dates of the programme, which was planned for the base alone. */
  readonly programme = computed(() => (this.choice().length > 0 ? null : (this.issue()?.programme ?? null)));

  private readonly pricing = resource({
    params: () => {
      const issue = this.issue();
      return issue && this.choice().length > 0 ? { issueId: issue.issue.id, choice: [...this.choice()] } : undefined;
    },
    loader: ({ params: { issueId, choice }, abortSignal }) =>
      this.api.call(openingCalls.priceChoice, { params: { issueId }, body: { choice }, signal: abortSignal }),
  });
  readonly isPricing = computed(() => this.choice().length > 0 && this.pricing.isLoading());
  readonly pricingProblem = computed(() => this.pricing.error()?.message ?? '');
  /** The last price that is known stays until the next one is there. */
  readonly price = linkedSignal<ReturnType<typeof this.known>, ClientIssue['price'] | undefined>({
    source: () => this.known(),
    computation: (price, before) => price ?? before?.value,
  }).asReadonly();

  open(issueId: string): void {
    this.issueId.set(issueId);
  }

  reload(): void {
    this.reading.reload();
  }

  /** Chooses one of a group (or the base of it), or ticks an extra. */
  choose(choice: readonly string[]): void {
    this.chosen.set(choice);
  }

  /** Puts a question into the thread, as the server kept it. */
  asked(question: Question): void {
    this.reading.update((issue) => issue && { ...issue, questions: [...issue.questions, question] });
  }

  /** Shows what was decided at once, so that nothing can be answered twice. */
  decided(decision: ClientDecision): void {
    this.reading.update((issue) => issue && { ...issue, decision, issue: { ...issue.issue, state: decision.kind } });
  }

  private known(): ClientIssue['price'] | undefined {
    if (this.choice().length === 0) return this.issue()?.price;
    return this.pricing.hasValue() && !this.pricing.isLoading() ? this.pricing.value() : undefined;
  }
}
