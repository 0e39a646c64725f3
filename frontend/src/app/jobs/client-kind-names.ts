import type { ClientContent } from '#shared/jobs/client-schema';

/** Who a client is. */
export const clientKindNames: Readonly<Record<ClientContent['kind'], string>> = {
  person: $localize`Person`,
  firm: $localize`Firm`,
  institution: $localize`Institution`,
};
