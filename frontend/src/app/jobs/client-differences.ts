import type { ClientContent } from '#shared/jobs/client-schema';
import { clientKindNames } from './client-kind-names';
import type { Difference } from './two-sides';

const names: Readonly<Record<keyof ClientContent, string>> = {
  name: $localize`Name`,
  kind: $localize`Who they are`,
  contact: $localize`Contact`,
  email: $localize`E-mail address`,
  telephone: $localize`Telephone`,
  website: $localize`Web site`,
  address: $localize`Address`,
  taxRegistration: $localize`Tax registration`,
  note: $localize`Note`,
};

const written = (field: keyof ClientContent, content: ClientContent): string =>
  field === 'kind' ? clientKindNames[content.kind] : content[field];

/** What was entered of a client and differs from what is kept; nothing when nobody kept anything meanwhile. */
export function clientDifferences(
  mine: ClientContent | undefined,
  theirs: ClientContent | undefined,
): Difference[] | undefined {
  if (!mine || !theirs) return undefined;
  const fields = Object.keys(names) as (keyof ClientContent)[];
  return fields
    .map((field) => ({ name: names[field], mine: written(field, mine), theirs: written(field, theirs) }))
    .filter((one) => one.mine !== one.theirs);
}
