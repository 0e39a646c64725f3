import type { Role } from '#shared/actor/role';

/** What the pages need to know of the workshop one is in. */
export interface WorkshopFacts {
  readonly id: string;
  readonly name: string;
  readonly locale: string;
  readonly currency: string;
  readonly lengthUnit: 'mm' | 'in';
  readonly timeZone: string;
  /** What its invoices usually stand under, as a code of UNCL 5305. */
  readonly defaultTaxCategory: string;
}

/** How figures are written for whoever reads. */
export type ReaderFacts = Pick<WorkshopFacts, 'locale' | 'currency' | 'lengthUnit' | 'timeZone'>;

/** A workshop one belongs to, and what one does there. */
export interface MembershipFacts {
  readonly id: string;
  readonly workshopName: string;
  readonly roles: readonly Role[];
}

/** Who is signed in, where, and where else they might be. */
export interface SessionFacts {
  readonly accountId: string;
  readonly name: string;
  readonly email: string;
  readonly memberships: readonly MembershipFacts[];
  readonly membership?: MembershipFacts;
  readonly workshop?: WorkshopFacts;
}
