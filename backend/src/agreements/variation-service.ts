import type { Actor } from '#shared/actor/actor';
import { Rejection } from '#shared/problems/rejection';
import type { WorkshopService } from '../accounts';
import type { Estimates } from '../estimates';
import type { ContractService } from './contract-service';

interface Parts {
  readonly contracts: ContractService;
  readonly estimates: Pick<Estimates, 'drafts'>;
  readonly workshops: WorkshopService;
}

/** Changes of what was agreed: small estimates of their own, accepted the same way. */
export class VariationService {
  constructor(private readonly parts: Parts) {}

  /** Refused as long as nothing is agreed, and in any other currency; the same id again finds what was begun. */
  async begin(actor: Actor, jobId: string, { id, title }: { id: string; title: string }) {
    const contract = await this.parts.contracts.contract(actor.workshopId, jobId);
    if (!contract) throw new Rejection('conflict', 'variation-no-contract');
    const { currency } = await this.parts.workshops.get(actor.workshopId);
    if (currency !== contract.currency)
      throw new Rejection('conflict', 'variation-other-currency', { values: { currency: contract.currency } });
    return this.parts.estimates.drafts.begin(actor, { jobId, id }, { title, kind: 'variation' });
  }
}
