import { Injectable, inject, signal } from '@angular/core';
import { Router } from '@angular/router';
import type { StageClaim } from '#shared/invoices/stage-claim';
import { newId } from '../core/new-id';
import { Notices } from '../core/problems/notices';
import { ProblemError } from '../core/problems/problem-error';
import { InvoiceCalls } from './invoice-calls';

/** What is claimed of an accepted issue of a job. */
interface Claimed {
  readonly jobId: string;
  readonly issueId: string;
  readonly claim: StageClaim;
}

/** Drafts the invoice or credit note of a claim and opens it, one after the other. A page provides its own. */
@Injectable()
export class StageDrafting {
  private readonly calls = inject(InvoiceCalls);
  private readonly router = inject(Router);
  private readonly notices = inject(Notices);
  private readonly busy = signal(false);
  /** Made once for each claim: a second press drafts nothing twice. */
  private readonly ids = new Map<string, string>();

  readonly isBusy = this.busy.asReadonly();

  /** False where it was refused, which is said; what is shown is to be read again then. */
  async draft({ jobId, issueId, claim }: Claimed): Promise<boolean> {
    if (this.busy()) return true;
    this.busy.set(true);
    const key = JSON.stringify([issueId, claim]);
    const invoiceId = this.ids.get(key) ?? newId();
    this.ids.set(key, invoiceId);
    try {
      await this.calls.beginStage(jobId, { invoiceId, issueId, claim });
      await this.router.navigate(['/accounts/invoices', invoiceId]);
      return true;
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      this.notices.complain(error.message);
      return false;
    } finally {
      this.busy.set(false);
    }
  }
}
