import * as passwords from '#shared/accounts/password-endpoints';
import * as people from '#shared/accounts/people-endpoints';
import * as sessions from '#shared/accounts/session-endpoints';
import * as workshops from '#shared/accounts/workshop-endpoints';
import type { Endpoint } from '#shared/actor/endpoint';
import * as history from '#shared/audit/history-endpoints';
import * as estimates from '#shared/estimates/estimates-endpoints';
import * as issues from '#shared/estimates/issues-endpoints';
import * as clients from '#shared/jobs/clients-endpoints';
import * as jobs from '#shared/jobs/jobs-endpoints';
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
].flatMap((file) => Object.values<object>(file).filter(isEndpoint));
