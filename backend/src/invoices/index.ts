import type { Accounts } from '../accounts';
import type { Agreements } from '../agreements';
import type { Audit } from '../audit';
import type { Jobs } from '../jobs';
import { ownOrigin } from '../platform/config/own-origin';
import type { Route } from '../platform/http/mount';
import type { Platform } from '../platform/platform';
import { CheckoutEntering } from './checkout-entering';
import { CheckoutRepository } from './checkout-repository';
import { CheckoutService } from './checkout-service';
import { currencyMayChange } from './currency-policy';
import { DraftService } from './draft-service';
import { DueStagesService, type OpenContracts } from './due-stages-service';
import { InvoiceLetters } from './invoice-letters';
import { InvoiceNumbers } from './invoice-numbers';
import { InvoicePaperMaking } from './invoice-paper-making';
import type { ContractOf, InvoiceParts } from './invoice-parts';
import { InvoiceReading } from './invoice-reading';
import { InvoiceRepository } from './invoice-repository';
import { invoiceRoutes } from './invoice-routes';
import { InvoiceSettingsService } from './invoice-settings-service';
import { IssuingService } from './issuing-service';
import { LedgerPapers } from './ledger-papers';
import { LedgerService } from './ledger-service';
import { MoneyBackService } from './money-back-service';
import { PaymentRepository } from './payment-repository';
import { paymentRoutes } from './payment-routes';
import { PaymentService } from './payment-service';
import { RefundService } from './refund-service';
import { SettlingService } from './settling-service';
import { StageDayRepository } from './stage-day-repository';
import { StatementLetters } from './statement-letters';
import { StageService } from './stage-service';

export { presentSummary } from './invoice-presenter';
export type { ContractOf } from './invoice-parts';
export type { CheckoutService, Payer } from './checkout-service';
export type { InvoiceReading } from './invoice-reading';
export type { InvoiceRow } from './invoice-model';

export interface Invoices {
  readonly drafts: DraftService;
  readonly stages: StageService;
  readonly issuing: IssuingService;
  readonly recording: PaymentService;
  readonly refunds: RefundService;
  readonly checkouts: CheckoutService;
  readonly reading: InvoiceReading;
  readonly ledger: LedgerService;
  readonly settings: InvoiceSettingsService;
  readonly routes: readonly Route[];
}

/** What stands before invoices in the list of features, and what was agreed. */
export interface InvoicesNeeds {
  readonly accounts: Accounts;
  readonly audit: Audit;
  readonly jobs: Jobs;
  readonly letters: Agreements['letters'];
  readonly contract: ContractOf;
  readonly openContracts: OpenContracts;
}

function partsOf({ config, database, clock, files }: Platform, needs: InvoicesNeeds): InvoiceParts {
  const { accounts, audit, jobs, contract, letters } = needs;
  const workshops = accounts.workshops;
  return {
    invoices: new InvoiceRepository(database),
    payments: new PaymentRepository(database),
    settings: new InvoiceSettingsService({ database, workshops, audit: audit.service }),
    ...{ workshops, jobs, audit: audit.service, files, clock, contract },
    ...{ clientLetters: letters, clientEntrance: `${ownOrigin(config)}/client/sign-in` },
    papers: new InvoicePaperMaking(),
  };
}

/** Invoices, credit notes, and everything that is paid, owed and given back. */
export function openInvoices(platform: Platform, needs: InvoicesNeeds): Invoices {
  const { database, cards } = platform;
  const parts = partsOf(platform, needs);
  parts.workshops.followCurrency(currencyMayChange(parts));
  const drafts = new DraftService(parts);
  const settling = new SettlingService(parts);
  const days = new StageDayRepository(database);
  const stages = new StageService({ ...parts, drafts, days });
  const due = new DueStagesService({ ...parts, days, contracts: needs.openContracts });
  const issuing = new IssuingService({ ...parts, stages, settling, numbers: new InvoiceNumbers(database) });
  const ledger = new LedgerService(parts);
  const reading = new InvoiceReading({ ...parts, issuing, ledger });
  const letters = new InvoiceLetters(parts);
  const recording = new PaymentService({ ...parts, settling });
  const rows = new CheckoutRepository(database);
  const moneyBack = new MoneyBackService({ ...parts, recording, settling });
  const refunds = new RefundService({ ...parts, moneyBack, cards });
  const entering = new CheckoutEntering({ ...parts, checkouts: rows, recording, moneyBack, settling, letters });
  const checkouts = new CheckoutService({ ...parts, database, checkouts: rows, cards, entering });
  const statements = new LedgerPapers(parts, ledger);
  const routes = [
    ...invoiceRoutes({ drafts, stages, due, issuing, reading, settings: parts.settings, letters }),
    ...paymentRoutes({
      recording,
      refunds,
      checkouts,
      ledger,
      papers: statements,
      statementLetters: new StatementLetters({ ...parts, ledger, statements }),
      reading,
      letters,
    }),
  ];
  return { drafts, stages, issuing, recording, refunds, checkouts, reading, ledger, settings: parts.settings, routes };
}
