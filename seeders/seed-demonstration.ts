import type { App } from '../backend/src/app';
import type { Platform } from '../backend/src/platform/platform';
import { demonstrationJobs } from './demonstration-jobs';
import {
  demonstrationPeople,
  demonstrationSettings,
  demonstrationWorkshop,
  type DemonstrationPerson,
} from './demonstration-people';
import { seedInvoices } from './seed-invoices';
import { seedJob } from './seed-job';
import { seedShop } from './seed-programme';

async function welcome(app: App, person: DemonstrationPerson, password: string) {
  const entry = { name: person.name, email: person.email, password, address: 'demonstration' };
  const { id: accountId, name } = await app.accounts.newcomers.welcome(entry, demonstrationWorkshop.name);
  return { accountId, name, roles: person.roles };
}

/** Founds the workshop with its people and settings; answers its owner as they act there. */
async function foundWorkshop(app: App, password: string) {
  const [first, ...others] = demonstrationPeople;
  const owner = await welcome(app, first, password);
  const workshopId = await app.accounts.workshops.found(owner, demonstrationWorkshop);
  for (const person of others) await app.accounts.workshops.join(workshopId, await welcome(app, person, password));
  const people = await app.accounts.people.list(workshopId);
  const membershipId = people.find(({ accountId }) => accountId === owner.accountId)?.id ?? '';
  const actor = { ...owner, membershipId, workshopId };
  await app.accounts.workshops.change(actor, 1, {
    ...demonstrationSettings,
    addressLines: [...demonstrationSettings.addressLines],
  });
  return actor;
}

/** Puts the demonstration into an empty database, once; answers whether it did. Everything goes through services and so obeys every rule. */
export function seedDemonstration(app: App, platform: Platform, password: string): Promise<boolean> {
  return platform.database.transaction(async () => {
    if (await app.accounts.isAnyFounded()) return false;
    const owner = await foundWorkshop(app, password);
    await seedShop(app, owner);
    for (const job of demonstrationJobs()) await seedJob(app, owner, job);
    await seedInvoices(app, platform, owner);
    return true;
  });
}
