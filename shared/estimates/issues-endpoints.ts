import * as z from 'zod';
import { endpoint, sameForPriced } from '#shared/actor/endpoint';
import {
  frozenDatesSchema,
  issueMarkSchema,
  issueRequestSchema,
  lineDifferenceSchema,
  papers,
  pricedIssueSummarySchema,
} from '#shared/estimates/issue-schema';
import { alternativeTotalSchema, costedEstimateSchema, pricedEstimateSchema } from '#shared/estimates/estimate-schema';
import { identifier } from '#shared/problems/entry-schema';

const oneEstimate = z.strictObject({ estimateId: identifier });
const oneIssue = z.strictObject({ issueId: identifier });

export const listIssues = endpoint({
  name: 'listIssues',
  summary: 'The issues of an estimate, the newest first',
  method: 'get',
  path: '/api/estimates/:estimateId/issues',
  callers: ['owner', 'estimator', 'office'],
  params: oneEstimate,
  answers: sameForPriced(z.strictObject({ items: z.array(pricedIssueSummarySchema) })),
});

export const issueEstimate = endpoint({
  name: 'issueEstimate',
  summary:
    'Freeze the estimate as its next issue, with its papers; refused when the draft changed, a rule forbids it, or the card is old and that is not said',
  method: 'post',
  path: '/api/estimates/:estimateId/issues',
  callers: ['owner', 'estimator'],
  params: oneEstimate,
  body: issueRequestSchema,
  idempotent: true,
  atOnce: 1,
  answers: { cost: pricedIssueSummarySchema },
});

export const readDifferences = endpoint({
  name: 'readDifferences',
  summary: 'Line by line, what the draft changes against the newest issue',
  method: 'get',
  path: '/api/estimates/:estimateId/differences',
  callers: ['owner', 'estimator', 'office'],
  params: oneEstimate,
  answers: sameForPriced(z.strictObject({ letter: z.string().nullable(), lines: z.array(lineDifferenceSchema) })),
});

const frozen = {
  summary: pricedIssueSummarySchema,
  differences: z.array(lineDifferenceSchema),
  alternatives: z.array(alternativeTotalSchema),
  /** Null where nothing was planned when it was issued. */
  dates: frozenDatesSchema.nullable(),
};

export const readIssue = endpoint({
  name: 'readIssue',
  summary: 'An issue as it was frozen, with the difference to the one before',
  method: 'get',
  path: '/api/issues/:issueId',
  callers: ['owner', 'estimator', 'office'],
  params: oneIssue,
  answers: {
    cost: z.strictObject({ ...frozen, estimate: costedEstimateSchema }),
    price: z.strictObject({ ...frozen, estimate: pricedEstimateSchema }),
  },
});

export const markIssue = endpoint({
  name: 'markIssue',
  summary: 'Say that an issue was sent, accepted or declined, when, and what was said',
  method: 'post',
  path: '/api/issues/:issueId/marks',
  callers: ['owner', 'estimator', 'office'],
  params: oneIssue,
  body: issueMarkSchema,
  answers: sameForPriced(pricedIssueSummarySchema),
});

export const readPaper = endpoint({
  name: 'readPaper',
  summary:
    'A paper of an issue, byte for byte as it was made when it was issued; the leaf order of one whose client took alternatives is made for these',
  method: 'get',
  path: '/api/issues/:issueId/papers/:paper',
  callers: ['owner', 'estimator', 'office'],
  params: oneIssue.extend({ paper: z.enum(papers) }),
  media: 'application/octet-stream',
  answers: sameForPriced(z.unknown()),
});

export const readBenchSheet = endpoint({
  name: 'readBenchSheet',
  summary:
    'What the bench needs to know of one piece, without any price: as it was agreed, or as it stands now where nothing is',
  method: 'get',
  path: '/api/estimates/:estimateId/pieces/:pieceId/bench-sheet.pdf',
  callers: ['owner', 'estimator', 'office', 'bench'],
  params: oneEstimate.extend({ pieceId: identifier }),
  media: 'application/pdf',
  atOnce: 4,
  answers: { cost: z.unknown(), price: z.unknown(), bench: z.unknown() },
});
