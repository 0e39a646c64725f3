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

/** What stands between a workshop and its clients: what they settle, what is invoiced, and the page for it. */
function openTowardsClients(platform: Platform, needs: Pick<App, 'accounts' | 'audit' | 'jobs' | 'estimates'>) {
  const agreements = openAgreements(platform, needs);
  const contract = agreements.contracts.contract.bind(agreements.contracts);
  const openContracts = agreements.contracts.open.bind(agreements.contracts);
  const invoices = openInvoices(platform, { ...needs, contract, openContracts, letters: agreements.letters });
  const clientInvoices = openClientInvoices(platform, invoices);
  const clientPage = openClientPage({ ...needs, agreements, invoices: clientInvoices });
  return { agreements, invoices, clientPage, clientInvoices };
}

/** Joins the features: each is given what stands before it in the list, and brings its routes. */
function openFeatures(platform: Platform) {
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
    ...{ accounts, audit, rateCards, jobs },
    papers: new PaperMaking(),
    programme: (workshopId, estimateId) => programme.programmes.frozen(workshopId, estimateId),
    agreed: (workshopId, issueIds) => towardsClients.agreements.decisions.accepted(workshopId, issueIds),
    mustHold: (workshopId, jobId, more) => towardsClients.agreements.contracts.mustHold(workshopId, jobId, more),
  });
  const programme: ProgrammeFeature = openProgramme(platform, { accounts, audit, rateCards, jobs, estimates });
  const towardsClients = openTowardsClients(platform, { accounts, audit, jobs, estimates });
  return { audit, accounts, rateCards, jobs, estimates, programme, ...towardsClients };
}

/** The application: all features with their routes, and the server that mounts them. */
export function openApp(platform: Platform, catcher?: MailCatcher): App {
  const features = openFeatures(platform);
  const { accounts, agreements } = features;
  const web = openWebServer(platform, {
    routes: Object.values(features).flatMap((feature) => feature.routes),
    identities: accounts.identities,
    visits: agreements.visits,
    isPage,
    catcher,
  });
  const sweep = async () =>
    void (await Promise.all([web.sweep(), accounts.sweep(), agreements.signIns.sweep(), platform.files.sweep()]));
  return { ...features, web, sweep };
}
