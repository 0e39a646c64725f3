import * as z from 'zod';
import type { CardEffect, CardEffectLine } from '#shared/rate-cards/card-effects';
import type { Finding } from '#shared/words/finding';
import type { WordCode } from '#shared/words/word-code';

/** How far the working out of a card's effects has come; `none` while nobody asked for it. */
export const cardEffectsStates = ['none', 'waiting', 'working', 'done', 'failed'] as const;
export type CardEffectsState = (typeof cardEffectsStates)[number];

const line = z.strictObject({
  lineId: z.string(),
  member: z.string().nullable(),
  kind: z.string(),
  name: z.string().nullable(),
  before_minor: z.int().nullable(),
  after_minor: z.int().nullable(),
}) satisfies z.ZodType<CardEffectLine>;

const finding = z.strictObject({
  kind: z.enum(['refuse', 'missing', 'warn', 'caution', 'note'] satisfies Finding['kind'][]),
  code: z.string() as unknown as z.ZodType<WordCode>,
  values: z.record(z.string(), z.union([z.string(), z.number()])),
  about: z.string().optional(),
});

const effect = z.strictObject({
  estimateId: z.string(),
  jobId: z.string(),
  number: z.string(),
  title: z.string(),
  jobTitle: z.string(),
  currency: z.string(),
  before_minor: z.int(),
  after_minor: z.int(),
  lines: z.array(line),
  findings: z.array(finding),
}) satisfies z.ZodType<CardEffect>;

/** What a card does to every open estimate, and whether that was worked out from the card as it stands. */
export const cardEffectsSchema = z.strictObject({
  state: z.enum(cardEffectsStates),
  isCurrent: z.boolean(),
  worked: z.int(),
  total: z.int(),
  workedAt: z.string().nullable(),
  effects: z.array(effect),
});
export type CardEffectsAnswer = z.infer<typeof cardEffectsSchema>;
