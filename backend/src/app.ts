import { openAccounts, type Accounts } from './accounts';
import { openAgreements, type Agreements } from './agreements';
import { openAudit, type Audit } from './audit';
import { openClientInvoices, openClientPage } from './client-page';
import { PaperMaking } from './documents';
import { openEstimates, type Estimates } from './estimates';
import { openInvoices, type Invoices } from './invoices';
import { openJobs, type Jobs } from './jobs';
import { isPage } from './is-page';
import { openWebServer, type WebServer } from './platform/http/web-server';
import type { MailCatcher } from './platform/mail/mail-catcher';
import type { Platform } from './platform/platform';
import { openProgramme, type ProgrammeFeature } from './programme';
import { openRateCards, type RateCards } from './rate-cards';

export interface App {
  readonly audit: Audit;
  readonly accounts: Accounts;
  readonly rateCards: RateCards;
  readonly jobs: Jobs;
  readonly estimates: Estimates;
  readonly programme: ProgrammeFeature;
  readonly agreements: Agreements;
  readonly invoices: Invoices;
  readonly web: WebServer;
  /** Clears away what has had its time: sessions, keys, links, files that no row names. */
  readonly sweep: () => Promise<void>;
}

/** Joins the features: each is given what stands before it in the list, and brings its routes. */
export function openApp(platform: Platform, catcher?: MailCatcher): App {
  const audit = openAudit(platform);
  const accounts = openAccounts(platform, audit);
  const rateCards = openRateCards(platform, {
    ...{ accounts, audit },
    effects: (asked, tell) => estimates.cardEffects(asked, tell),
  });
  const jobs = openJobs(platform, {
    ...{ audit, accounts },
    estimates: {
      hasIssues: (workshopId, jobId) => estimates.drafts.hasIssues(workshopId, jobId),
      dropDrafts: (workshopId, jobId) => estimates.drafts.drop(workshopId, jobId),
    },
  });
  const estimates: Estimates = openEstimates(platform, {
    accounts,
    audit,
    rateCards,
    jobs,
    papers: new PaperMaking(),
  });
  const programme = openProgramme(platform, { accounts, audit, rateCards, jobs, estimates });
  const agreements = openAgreements(platform, { accounts, audit, jobs, estimates });
  const contract = agreements.contracts.contract.bind(agreements.contracts);
  const invoices = openInvoices(platform, { accounts, audit, jobs, contract });
  const clientInvoices = openClientInvoices(platform, invoices);
  const clientPage = openClientPage({ accounts, estimates, agreements, invoices: clientInvoices });
  const features = [
    audit,
    accounts,
    rateCards,
    jobs,
    estimates,
    programme,
    agreements,
    invoices,
    clientPage,
    clientInvoices,
  ];
  const routes = features.flatMap((feature) => feature.routes);
  const web = openWebServer(platform, {
    routes,
    identities: accounts.identities,
    visits: agreements.visits,
    isPage,
    catcher,
  });
  const sweep = async () => void (await Promise.all([web.sweep(), accounts.sweep(), platform.files.sweep()]));
  return { audit, accounts, rateCards, jobs, estimates, programme, agreements, invoices, web, sweep };
}
