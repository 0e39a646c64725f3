import type { Actor } from '#shared/actor/actor';
import { Rejection } from '#shared/problems/rejection';
import type { EstimateRepository } from './estimate-repository';
import type { EstimateService } from './estimate-service';
import type { IssueRepository } from './issue-repository';

interface Parts {
  readonly estimates: EstimateRepository;
  readonly drafts: EstimateService;
  readonly issues: IssueRepository;
}

/** Where a workshop takes another currency: refused once anything was issued, since an issue stays in its own; before that its drafts follow. */
export const currencyChange =
  ({ estimates, drafts, issues }: Parts) =>
  async (actor: Actor, currency: string): Promise<void> => {
    if (await issues.isAny(actor.workshopId)) {
      const complaints = [{ path: ['currency'], code: 'currency-issued', values: {} } as const];
      throw new Rejection('conflict', 'currency-issued', { complaints });
    }
    for (const { id } of await estimates.list(actor.workshopId)) await drafts.carryOver(actor, id, currency);
  };
