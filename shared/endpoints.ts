import * as passwords from '#shared/accounts/password-endpoints';
import * as people from '#shared/accounts/people-endpoints';
import * as sessions from '#shared/accounts/session-endpoints';
import * as workshops from '#shared/accounts/workshop-endpoints';
import type { Endpoint } from '#shared/actor/endpoint';
import * as accesses from '#shared/agreements/accesses-endpoints';
import * as agreement from '#shared/agreements/agreement-endpoints';
import * as letters from '#shared/agreements/letters-endpoints';
import * as questions from '#shared/agreements/questions-endpoints';
import * as history from '#shared/audit/history-endpoints';
import * as clientInvoices from '#shared/client-page/client-invoices-endpoints';
import * as clientIssues from '#shared/client-page/client-issues-endpoints';
import * as clientVisits from '#shared/client-page/visits-endpoints';
import * as estimates from '#shared/estimates/estimates-endpoints';
import * as issues from '#shared/estimates/issues-endpoints';
import * as contractAccounts from '#shared/invoices/contract-account-endpoints';
import * as dueStages from '#shared/invoices/due-stages-endpoints';
import * as invoices from '#shared/invoices/invoices-endpoints';
import * as owed from '#shared/invoices/owed-endpoints';
import * as payments from '#shared/invoices/payments-endpoints';
import * as clients from '#shared/jobs/clients-endpoints';
import * as jobs from '#shared/jobs/jobs-endpoints';
import * as board from '#shared/programme/board-endpoints';
import * as programme from '#shared/programme/programme-endpoints';
import * as rateCards from '#shared/rate-cards/rate-cards-endpoints';

const isEndpoint = (value: object): value is Endpoint => 'path' in value && 'method' in value;

/** Every endpoint of the application, in the order of the features: whatever the endpoint files export as one. */
export const endpoints: readonly Endpoint[] = [
  history,
  sessions,
  passwords,
  workshops,
  people,
  rateCards,
  clients,
  jobs,
  estimates,
  issues,
  programme,
  board,
  accesses,
  questions,
  agreement,
  letters,
  invoices,
  contractAccounts,
  dueStages,
  payments,
  owed,
  clientVisits,
  clientIssues,
  clientInvoices,
].flatMap((file) => Object.values<object>(file).filter(isEndpoint));
