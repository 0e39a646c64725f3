/**
 * What the first page of a visit calls, without the schemas of the endpoints: making these, and reading the paper by them once more, would
 * hold up a phone for a tenth of the time its page takes. The endpoints are made of the same calls.
 */
export const firstCalls = {
  beginClientVisit: {
    name: 'beginClientVisit',
    summary:
      'Begin a visit with the secret of a mailed link; the answer holds the token that changing requests must carry, what there is to read, and the issue that is read first',
    method: 'post',
    path: '/api/client/visits',
    callers: 'anyone',
    atOnce: 4,
  },
  readClientOverview: {
    name: 'readClientOverview',
    summary: 'The jobs a client may see, with their issues and where these stand, and what is owed',
    method: 'get',
    path: '/api/client/overview',
    callers: 'client',
  },
  readClientLogo: {
    name: 'readClientLogo',
    summary: 'The picture of the workshop’s letterhead',
    method: 'get',
    path: '/api/client/logo',
    callers: 'client',
    media: 'image/png',
  },
  readClientIssue: {
    name: 'readClientIssue',
    summary: 'An issue as its client reads it, with all that was asked about the job',
    method: 'get',
    path: '/api/client/issues/:issueId',
    callers: 'client',
    atOnce: 2,
  },
  priceClientChoice: {
    name: 'priceClientChoice',
    summary: 'What an issue comes to with these alternatives',
    method: 'post',
    path: '/api/client/issues/:issueId/prices',
    callers: 'client',
    atOnce: 4,
  },
  readClientPaper: {
    name: 'readClientPaper',
    summary:
      'The paper of an issue with these alternatives (their ids, commas between); of one that was accepted, the very paper accepted',
    method: 'get',
    path: '/api/client/issues/:issueId/estimate.pdf',
    callers: 'client',
    media: 'application/pdf',
    atOnce: 4,
  },
} as const;
