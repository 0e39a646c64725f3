import { v7 as newId } from 'uuid';
import type { Actor } from '#shared/actor/actor';
import { startInvoiceSettings } from '#shared/invoices/invoice-settings';
import type { App } from '../backend/src/app';
import { openInvoices, type Invoices } from '../backend/src/invoices';
import type { Platform } from '../backend/src/platform/platform';
import { demonstrationSettings } from './demonstration-people';
import { repairContent } from './repair-invoice';

const sixWeeks_milliseconds = 42 * 24 * 3_600_000;

/** The same services, six weeks ago by their clock: an invoice of that time is overdue by now. */
function invoicesOfThen(app: App, platform: Platform): Invoices {
  const { accounts, audit, jobs, agreements } = app;
  const clock = { now: () => new Date(platform.clock.now().getTime() - sixWeeks_milliseconds) };
  const contract = agreements.contracts.contract.bind(agreements.contracts);
  const openContracts = agreements.contracts.open.bind(agreements.contracts);
  const agreed = { contract, openContracts, letters: agreements.letters };
  return openInvoices({ ...platform, clock }, { accounts, audit, jobs, ...agreed });
}

async function sayWho({ invoices }: App, owner: Actor): Promise<void> {
  const settings = startInvoiceSettings(demonstrationSettings);
  const account = { name: demonstrationSettings.name, iban: 'IE61HXLN93115212345678', bic: 'HXLNIE2D' };
  const closing = 'Goods stay ours until they are paid for.';
  await invoices.settings.keep(owner, 0, { ...settings, account, closing });
}

/** The job whose estimate was accepted, with its contract. */
async function acceptedJob({ jobs, agreements }: App, { workshopId }: Actor) {
  const { items } = await jobs.service.page(workshopId, { order: 'number', search: '', state: 'accepted', limit: 1 });
  const [job] = items;
  const contract = await agreements.contracts.contract(workshopId, job?.id ?? '');
  if (!contract) throw new Error('no job of the demonstration was accepted');
  return { contract, client: await jobs.client(workshopId, contract.clientId) };
}

/** An invoice of six weeks ago that nobody has paid, for a repair without an estimate. */
async function seedOverdue(
  then: Invoices,
  owner: Actor,
  client: { id: string; name: string; address: string; email: string },
) {
  const id = newId();
  await then.drafts.keep(owner, { id, version: 0 }, repairContent(client));
  await then.issuing.issue(owner, id, 1);
}

/** Puts the books into the demonstration: a repair that is overdue, a deposit that was paid, a stage that is open. */
export async function seedInvoices(app: App, platform: Platform, owner: Actor): Promise<void> {
  const { stages, issuing, recording, reading } = app.invoices;
  const { workshopId } = owner;
  await sayWho(app, owner);
  const { contract, client } = await acceptedJob(app, owner);
  await seedOverdue(invoicesOfThen(app, platform), owner, client);
  const account = await stages.account(workshopId, contract.jobId);
  const [deposit, stage] = account?.parts[0].next ?? [];
  for (const { claim } of [deposit, stage]) {
    const invoiceId = newId();
    await stages.begin(owner, contract.jobId, { invoiceId, issueId: contract.parts[0].issueId, claim });
    const { currency, dueMinor } = await issuing.issue(owner, invoiceId, 1);
    if (claim.of !== 'deposit') continue;
    await recording.record(owner, {
      ...{
        clientId: client.id,
        way: 'bank',
        currency,
        amount_minor: dueMinor,
        reference: 'Transfer',
        surplus: 'refuse',
      },
      receivedOn: await reading.today(workshopId),
      shares: [{ invoiceId, amount_minor: dueMinor }],
    });
  }
}
