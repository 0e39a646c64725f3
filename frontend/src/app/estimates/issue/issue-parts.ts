import { Injectable, computed, inject } from '@angular/core';
import { Router, type UrlTree } from '@angular/router';
import { issueLetter } from '#shared/estimates/issue-letter';
import type { PricedIssueSummary } from '#shared/estimates/issue-schema';
import { Formats } from '../../core/formats/formats';
import { EstimateStore } from '../estimate-store';
import type { Part } from '../parts/part';
import { issueStateNames } from './issue-state-names';

/** The draft that is to become the next issue. */
export const draftKey = 'draft';

/** The list of issues: the draft toward the next one, then those made, the newest first, with day, state and gross price. */
@Injectable()
export class IssueParts {
  private readonly store = inject(EstimateStore);
  private readonly formats = inject(Formats);
  private readonly router = inject(Router);

  /** The letter the next issue will bear. */
  readonly nextLetter = computed(() => issueLetter(this.store.issues().length + 1));
  readonly listRoute = computed(() => this.route());
  readonly parts = computed<readonly Part[]>(() => [
    this.draft(),
    ...this.store.issues().map((issue) => this.issue(issue)),
  ]);

  /** The address of an issue, by its id. */
  issueRoute(issueId: string): UrlTree {
    return this.router.createUrlTree([...this.path(), issueId]);
  }

  /** The day an issue was sent, accepted or declined on; the day it was made where it was not. */
  dayOf({ markedOn, issuedAt }: PricedIssueSummary): string {
    return markedOn ? this.formats.day(markedOn) : this.formats.dayOf(issuedAt);
  }

  private path(): string[] {
    const opened = this.store.ids();
    return ['/jobs', opened?.jobId ?? '', 'estimates', opened?.estimateId ?? '', 'issue'];
  }

  private route(part?: string): UrlTree {
    return this.router.createUrlTree(this.path(), part ? { queryParams: { part } } : {});
  }

  private draft(): Part {
    const gross_minor = this.store.priced()?.price.gross_minor;
    return {
      key: draftKey,
      name: $localize`Issue ${this.nextLetter()}:letter:`,
      about: $localize`the draft, as it stands`,
      amount: gross_minor === undefined ? '' : this.formats.wholeMoney(gross_minor),
      route: this.route(draftKey),
    };
  }

  private issue(issue: PricedIssueSummary): Part {
    return {
      key: issue.id,
      name: $localize`Issue ${issue.letter}:letter:`,
      about: `${issueStateNames[issue.state]}, ${this.dayOf(issue)}`,
      amount: this.formats.wholeMoney((issue.agreed ?? issue).gross_minor),
      route: this.issueRoute(issue.id),
    };
  }
}
