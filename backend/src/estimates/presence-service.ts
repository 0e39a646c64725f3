import type { Actor } from '#shared/actor/actor';
import type { EstimateParts } from './estimate-service';
import type { PresenceRepository } from './presence-repository';

/** Three missed calls of a page that tells every twenty seconds. */
const present_milliseconds = 60_000;

interface Parts extends Pick<EstimateParts, 'estimates' | 'cards' | 'clock'> {
  readonly presences: PresenceRepository;
}

/** Who is at work on an estimate, so that two people know of each other. */
export class PresenceService {
  constructor(private readonly parts: Parts) {}

  async tell(
    actor: Actor,
    estimateId: string,
  ): Promise<{ version: number; others: string[]; rateCardInForceId: string }> {
    const { workshopId, membershipId, name } = actor;
    const { version } = await this.parts.estimates.get(workshopId, estimateId);
    const now = this.parts.clock.now();
    await this.parts.presences.tell(workshopId, { estimateId, membershipId, name, seenAt: now });
    const since = new Date(now.getTime() - present_milliseconds);
    const others = await this.parts.presences.others(workshopId, { estimateId, membershipId }, since);
    return { version, others, rateCardInForceId: (await this.parts.cards.inForce(workshopId)).id };
  }
}
