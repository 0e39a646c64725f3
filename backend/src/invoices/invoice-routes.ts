import { beginStageInvoice, nameStageDay, readContractAccount } from '#shared/invoices/contract-account-endpoints';
import { listDueStages } from '#shared/invoices/due-stages-endpoints';
import {
  beginCreditNote,
  issueInvoice,
  keepInvoice,
  keepInvoiceSettings,
  listInvoices,
  readInvoice,
  readInvoicePaper,
  readInvoiceSettings,
  removeInvoice,
  sendInvoice,
} from '#shared/invoices/invoices-endpoints';
import { mount, type Route } from '../platform/http/mount';
import type { DraftService } from './draft-service';
import type { DueStagesService } from './due-stages-service';
import type { InvoiceLetters } from './invoice-letters';
import { presentCurrent } from './invoice-presenter';
import type { InvoiceReading } from './invoice-reading';
import type { InvoiceSettingsService } from './invoice-settings-service';
import type { IssuingService } from './issuing-service';
import type { StageService } from './stage-service';

interface Parts {
  readonly drafts: DraftService;
  readonly stages: StageService;
  readonly due: DueStagesService;
  readonly issuing: IssuingService;
  readonly reading: InvoiceReading;
  readonly settings: InvoiceSettingsService;
  readonly letters: InvoiceLetters;
}

export const invoiceRoutes = ({ drafts, stages, due, issuing, reading, settings, letters }: Parts): Route[] => [
  mount(readInvoiceSettings, ({ actor }) => settings.read(actor.workshopId)),
  mount(keepInvoiceSettings, ({ actor, version, body }) => settings.keep(actor, version, body)),
  mount(listInvoices, ({ actor, query }) => reading.page(actor.workshopId, query)),
  mount(readInvoice, ({ actor, params }) => reading.get(actor.workshopId, params.invoiceId)),
  mount(
    keepInvoice,
    async ({ actor, params, version, body }) =>
      reading.read(await drafts.keep(actor, { id: params.invoiceId, version }, body)),
    presentCurrent,
  ),
  mount(
    removeInvoice,
    ({ actor, params, version }) => drafts.remove(actor, { id: params.invoiceId, version }),
    presentCurrent,
  ),
  mount(beginCreditNote, async ({ actor, params, body }) =>
    reading.read(await drafts.beginCreditNote(actor, params.invoiceId, body.creditNoteId)),
  ),
  mount(issueInvoice, async ({ actor, params, body }) =>
    reading.read(await issuing.issue(actor, params.invoiceId, body.version)),
  ),
  mount(readInvoicePaper, ({ actor, params }) => reading.paper(actor.workshopId, params.invoiceId, params.paper)),
  mount(sendInvoice, ({ actor, params, body }) => letters.send(actor, params.invoiceId, body.note)),
  mount(readContractAccount, async ({ actor, params }) => ({
    contract: await stages.account(actor.workshopId, params.jobId),
  })),
  mount(listDueStages, ({ actor, query }) => due.page(actor.workshopId, query)),
  mount(beginStageInvoice, async ({ actor, params, body }) =>
    reading.read(await stages.begin(actor, params.jobId, body)),
  ),
  mount(nameStageDay, ({ actor, params, body }) => stages.nameDay(actor, params.jobId, body)),
];
