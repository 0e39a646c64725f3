import type { Role } from '#shared/actor/role';

/** Who asks: a person in one workshop, as the session says. */
export interface Actor {
  readonly accountId: string;
  readonly membershipId: string;
  readonly workshopId: string;
  readonly name: string;
  readonly roles: readonly Role[];
}
