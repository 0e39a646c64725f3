import * as z from 'zod';
import { choiceSchema } from '#shared/agreements/choice-schema';
import { questionSchema, questionText } from '#shared/agreements/question-schema';
import { endpoint } from '#shared/actor/endpoint';
import { clientDecisionSchema, clientIssueSchema } from '#shared/client-page/client-issue-schema';
import { clientOverviewSchema } from '#shared/client-page/client-overview-schema';
import { clientPriceSchema, clientReviewSchema } from '#shared/client-page/client-price-schema';
import { firstCalls } from '#shared/client-page/first-calls';
import { identifier, line, paragraphs } from '#shared/problems/entry-schema';

const oneIssue = z.strictObject({ issueId: identifier });
const choosing = z.strictObject({ choice: choiceSchema });

export const readClientOverview = endpoint({
  ...firstCalls.readClientOverview,
  answers: { public: clientOverviewSchema },
});

export const readClientLogo = endpoint({
  ...firstCalls.readClientLogo,
  answers: { public: z.unknown() },
});

export const readClientIssue = endpoint({
  ...firstCalls.readClientIssue,
  params: oneIssue,
  answers: { public: clientIssueSchema },
});

export const priceClientChoice = endpoint({
  ...firstCalls.priceClientChoice,
  params: oneIssue,
  body: choosing,
  answers: { public: clientPriceSchema },
});

export const reviewClientChoice = endpoint({
  name: 'reviewClientChoice',
  summary:
    'The last look before accepting: what the choice comes to, and the SHA-256 of the paper that would be accepted',
  method: 'post',
  path: '/api/client/issues/:issueId/review',
  callers: 'client',
  params: oneIssue,
  body: choosing,
  atOnce: 2,
  answers: { public: clientReviewSchema },
});

export const readClientPaper = endpoint({
  ...firstCalls.readClientPaper,
  params: oneIssue,
  query: z.strictObject({ choice: z.string().max(1000).default('') }),
  answers: { public: z.unknown() },
});

export const askClientQuestion = endpoint({
  name: 'askClientQuestion',
  summary: 'Ask the workshop about an issue',
  method: 'post',
  path: '/api/client/issues/:issueId/questions',
  callers: 'client',
  params: oneIssue,
  body: z.strictObject({ text: questionText }),
  answers: { public: questionSchema },
});

export const acceptIssue = endpoint({
  name: 'acceptIssue',
  summary: 'Accept an issue with these alternatives, at the price and on the paper that were reviewed',
  method: 'post',
  path: '/api/client/issues/:issueId/acceptance',
  callers: 'client',
  params: oneIssue,
  body: z.strictObject({
    typedName: line(120),
    agrees: z.literal(true),
    choice: choiceSchema,
    gross_minor: z.int(),
    pdfSha256: z.string().regex(/^[0-9a-f]{64}$/),
  }),
  idempotent: true,
  atOnce: 2,
  answers: { public: clientDecisionSchema },
});

export const declineIssue = endpoint({
  name: 'declineIssue',
  summary: 'Decline an issue, and say why',
  method: 'post',
  path: '/api/client/issues/:issueId/refusal',
  callers: 'client',
  params: oneIssue,
  body: z.strictObject({ reason: paragraphs(2000) }),
  answers: { public: clientDecisionSchema },
});
