import * as z from 'zod';
import { endpoint } from '#shared/actor/endpoint';
import { pageOf, pageQuery } from '#shared/actor/page-schema';
import { day, identifier } from '#shared/problems/entry-schema';
import { cardDifferenceSchema } from '#shared/rate-cards/card-difference-schema';
import { cardEffectsSchema } from '#shared/rate-cards/card-effects-schema';
import { rateCardSchema } from '#shared/rate-cards/rate-card-schema';
import { rateCardName, rateCardSummarySchema } from '#shared/rate-cards/rate-card-summary-schema';

const oneCard = z.strictObject({ rateCardId: identifier });

/** A rate card with its content. */
export const wholeRateCardSchema = rateCardSummarySchema.extend({ content: rateCardSchema });
export type WholeRateCard = z.infer<typeof wholeRateCardSchema>;

const summary = { cost: rateCardSummarySchema } as const;
const whole = { cost: wholeRateCardSchema } as const;
const workbook = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';

export const listRateCards = endpoint({
  name: 'listRateCards',
  summary: 'The rate cards, the newest first, each with where it stands today.',
  method: 'get',
  path: '/api/rate-cards',
  callers: ['owner', 'estimator'],
  query: z.strictObject(pageQuery),
  answers: { cost: pageOf(rateCardSummarySchema) },
});

export const readRateCard = endpoint({
  name: 'readRateCard',
  summary: 'One rate card with its content.',
  method: 'get',
  path: '/api/rate-cards/:rateCardId',
  callers: ['owner', 'estimator'],
  params: oneCard,
  answers: whole,
});

export const copyRateCard = endpoint({
  name: 'copyRateCard',
  summary: 'Begin a draft with everything a card holds; the browser makes the id, a repeated call is harmless.',
  method: 'post',
  path: '/api/rate-cards/:rateCardId/copies',
  callers: ['owner'],
  params: oneCard,
  body: z.strictObject({ id: identifier, name: rateCardName }),
  answers: summary,
});

export const keepRateCard = endpoint({
  name: 'keepRateCard',
  summary: 'Keep a draft of a rate card; one in force or set for a day is refused.',
  method: 'put',
  path: '/api/rate-cards/:rateCardId',
  callers: ['owner'],
  params: oneCard,
  body: z.strictObject({ name: rateCardName, content: rateCardSchema }),
  versioned: true,
  answers: summary,
});

export const removeRateCard = endpoint({
  name: 'removeRateCard',
  summary: 'Remove a draft of a rate card.',
  method: 'delete',
  path: '/api/rate-cards/:rateCardId',
  callers: ['owner'],
  params: oneCard,
  versioned: true,
  answers: {},
});

export const readCardDifferences = endpoint({
  name: 'readCardDifferences',
  summary:
    'Line by line, what a card changes against the one it takes over from, a draft as if it began today or on a day, or against another.',
  method: 'get',
  path: '/api/rate-cards/:rateCardId/differences',
  callers: ['owner', 'estimator'],
  params: oneCard,
  query: z.strictObject({ against: identifier.optional(), from: day.optional() }),
  answers: {
    cost: z.strictObject({ against: rateCardSummarySchema, differences: z.array(cardDifferenceSchema) }),
  },
});

export const workCardEffects = endpoint({
  name: 'workCardEffects',
  summary:
    'Begin to work out what a draft would do to every open estimate; ask for the progress by reading the effects.',
  method: 'post',
  path: '/api/rate-cards/:rateCardId/effects',
  callers: ['owner'],
  params: oneCard,
  answers: { cost: cardEffectsSchema },
});

export const readCardEffects = endpoint({
  name: 'readCardEffects',
  summary: 'What a draft would do to every open estimate, as far as it is worked out.',
  method: 'get',
  path: '/api/rate-cards/:rateCardId/effects',
  callers: ['owner', 'estimator'],
  params: oneCard,
  answers: { cost: cardEffectsSchema },
});

export const putRateCardInForce = endpoint({
  name: 'putRateCardInForce',
  summary:
    'Work with a card from a day on, today or later; from then it is never changed. A repeated call is harmless.',
  method: 'put',
  path: '/api/rate-cards/:rateCardId/in-force',
  callers: ['owner'],
  params: oneCard,
  body: z.strictObject({ from: day }),
  versioned: true,
  answers: summary,
});

export const takeRateCardBack = endpoint({
  name: 'takeRateCardBack',
  summary: 'Make a card that is set for a later day a draft again.',
  method: 'delete',
  path: '/api/rate-cards/:rateCardId/in-force',
  callers: ['owner'],
  params: oneCard,
  versioned: true,
  answers: summary,
});

export const exportRateCard = endpoint({
  name: 'exportRateCard',
  summary: 'A rate card as a workbook, one sheet for each list.',
  method: 'get',
  path: '/api/rate-cards/:rateCardId/workbook',
  callers: ['owner', 'estimator'],
  params: oneCard,
  media: workbook,
  atOnce: 2,
  answers: { cost: z.unknown() },
});

export const importRateCard = endpoint({
  name: 'importRateCard',
  summary: 'Fill a draft from a workbook; every bad cell is named by sheet, row and column, and nothing is half taken.',
  method: 'post',
  path: '/api/rate-cards/:rateCardId/workbook',
  callers: ['owner'],
  params: oneCard,
  upload: 'workbook',
  versioned: true,
  atOnce: 2,
  answers: summary,
});
