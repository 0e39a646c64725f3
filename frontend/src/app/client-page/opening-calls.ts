import type { readSession } from '#shared/accounts/session-endpoints';
import { readSessionCall } from '#shared/accounts/session-call';
import { bareEndpoint } from '#shared/actor/endpoint';
import type * as issues from '#shared/client-page/client-issues-endpoints';
import { firstCalls } from '#shared/client-page/first-calls';
import type * as visits from '#shared/client-page/visits-endpoints';

/** The endpoints of a first visit, whose schemas stay away until there is a form to check. */
export const openingCalls = {
  readSession: bareEndpoint<typeof readSession>(readSessionCall),
  beginVisit: bareEndpoint<typeof visits.beginClientVisit>(firstCalls.beginClientVisit),
  readOverview: bareEndpoint<typeof issues.readClientOverview>(firstCalls.readClientOverview),
  readIssue: bareEndpoint<typeof issues.readClientIssue>(firstCalls.readClientIssue),
  priceChoice: bareEndpoint<typeof issues.priceClientChoice>(firstCalls.priceClientChoice),
} as const;
