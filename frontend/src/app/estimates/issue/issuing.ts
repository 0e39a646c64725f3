import { Injectable, computed, inject, signal } from '@angular/core';
import type { PricedIssueSummary } from '#shared/estimates/issue-schema';
import { newId } from '../../core/new-id';
import { ProblemError } from '../../core/problems/problem-error';
import { UnfinishedEntries } from '../draft/unfinished-entries';
import { EstimateStore } from '../estimate-store';
import { IssueClient, type IssueRequest } from './issue-client';

/** A request with the key it goes out under, kept until the server has answered it. */
interface Sent {
  readonly text: string;
  readonly key: string;
}

const cardOld = 'urn:problem:issue-card-old';

/** Issuing: once for each press however often the button is hit, and again under the same key where no answer came. */
@Injectable()
export class Issuing {
  private readonly client = inject(IssueClient);
  private readonly store = inject(EstimateStore);
  private readonly unfinished = inject(UnfinishedEntries);
  private readonly busy = signal(false);
  private readonly complaint = signal<readonly string[]>([]);
  private readonly cardWasOld = signal(false);
  private sent: Sent | undefined;

  readonly isBusy = this.busy.asReadonly();
  /** Why it was not issued. */
  readonly complaints = this.complaint.asReadonly();
  /** The card is no longer in force, as the page heard or as the server said. */
  readonly isCardOld = computed(() => this.store.isCardOld() || this.cardWasOld());

  /** The issue that was made; undefined where it was refused, or a press is under way already. */
  async press(asked: Omit<IssueRequest, 'version'>): Promise<PricedIssueSummary | undefined> {
    if (this.busy()) return undefined;
    this.busy.set(true);
    this.complaint.set([]);
    try {
      return await this.send(asked);
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      await this.refuse(error);
      return undefined;
    } finally {
      this.busy.set(false);
    }
  }

  private async send(asked: Omit<IssueRequest, 'version'>): Promise<PricedIssueSummary | undefined> {
    const isKept = await this.store.flush();
    const head = this.store.head();
    if (!isKept || this.unfinished.ids().size > 0 || !head) {
      this.complaint.set([$localize`Some entries are not kept yet. Finish those that are marked, then issue.`]);
      return undefined;
    }
    if (this.isCardOld() && !asked.acceptsOldCard) {
      this.complaint.set([$localize`Say that the old rate card is meant, or take the card in force.`]);
      return undefined;
    }
    const body = { ...asked, version: head.version };
    const issue = await this.client.issue(head.id, body, this.keyOf(JSON.stringify(body)));
    this.sent = undefined;
    this.store.reloadIssues();
    return issue;
  }

  /** The same request that got no answer goes out under its key again: if it was done, that answer comes back. */
  private keyOf(text: string): string {
    if (this.sent?.text !== text) this.sent = { text, key: newId() };
    return this.sent.key;
  }

  private async refuse(error: ProblemError): Promise<void> {
    if (!error.isPassing) this.sent = undefined;
    if (error.problem.type === cardOld) this.cardWasOld.set(true);
    const errors = error.problem.errors.map(({ message }) => message);
    this.complaint.set([error.message, ...errors]);
    if (error.isStale) await this.store.reload();
  }
}
