import { randomUUID } from 'node:crypto';
import { askForClientSignIn } from '#shared/client-page/visits-endpoints';
import type { ClientRow, ClientRows, MatrixRows } from '../matrix-row';
import { acceptanceOf, clientOf, linkTo, sampleIssue } from '../sample-client-visit';
import type { Parts, Visitor } from '../visitor';

/** A client who looks at an issue of theirs, and what they send. */
const onIssue = (partsOf: (visitor: Visitor, issueId: string) => Parts | Promise<Parts>): ClientRow['visit'] => {
  return async (workshop, api) => {
    const { issueId } = await sampleIssue(workshop, api);
    const visitor = await clientOf(workshop, api, issueId);
    return { visitor, parts: await partsOf(visitor, issueId) };
  };
};
const choosing = onIssue((_, issueId) => ({ params: { issueId }, body: { choice: [] } }));

export const visitsRows: MatrixRows = {
  beginClientVisit: {
    prepare: async (workshop, api) => {
      const { issueId } = await sampleIssue(workshop, api);
      return { body: { token: (await linkTo(workshop, api, issueId)).token } };
    },
    history: 'history-access-opened',
  },
  [askForClientSignIn.name]: {
    // Each asks for somebody else: letters to one address are counted.
    prepare: () => ({ body: { email: `${randomUUID()}@elsewhere.example` } }),
  },
};

export const clientPageRows: ClientRows = {
  readClientOverview: { visit: onIssue(() => ({})) },
  readClientLogo: { visit: onIssue(() => ({})), status: 404 },
  readClientIssue: { visit: onIssue((_, issueId) => ({ params: { issueId } })) },
  priceClientChoice: { visit: choosing },
  reviewClientChoice: { visit: choosing },
  readClientPaper: { visit: onIssue((_, issueId) => ({ params: { issueId } })) },
  askClientQuestion: {
    visit: onIssue((_, issueId) => ({ params: { issueId }, body: { text: 'May the edge stay plain?' } })),
    history: 'history-question-asked',
  },
  acceptIssue: { visit: onIssue(acceptanceOf), history: 'history-issue-accepted', entries: 2 },
  declineIssue: {
    visit: onIssue((_, issueId) => ({ params: { issueId }, body: { reason: 'We wait a year.' } })),
    history: 'history-issue-declined',
    entries: 2,
  },
};
