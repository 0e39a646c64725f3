import * as z from 'zod';
import { letterKinds } from '#shared/agreements/letter-kinds';
import {
  givenUpLetterSchema,
  letterPreviewSchema,
  letterTemplateSchema,
  letterTextSchema,
} from '#shared/agreements/letter-template-schema';
import { endpoint, sameForPriced } from '#shared/actor/endpoint';
import { identifier } from '#shared/problems/entry-schema';

const kind = z.enum(letterKinds);
const wordsOfKind = letterTextSchema.extend({ kind });

export const listLetterTemplates = endpoint({
  name: 'listLetterTemplates',
  summary: 'The words of every kind of letter to clients, the workshop’s own where it has some',
  method: 'get',
  path: '/api/letter-templates',
  callers: ['owner', 'office'],
  answers: sameForPriced(z.strictObject({ items: z.array(letterTemplateSchema) })),
});

export const keepLetterTemplate = endpoint({
  name: 'keepLetterTemplate',
  summary: 'Write the words of a kind of letter; version 0 where the workshop had none of its own',
  method: 'put',
  path: '/api/letter-templates',
  callers: ['owner', 'office'],
  body: wordsOfKind,
  versioned: true,
  answers: sameForPriced(letterTemplateSchema),
});

export const resetLetterTemplate = endpoint({
  name: 'resetLetterTemplate',
  summary: 'Go back to the words a kind of letter has of itself',
  method: 'post',
  path: '/api/letter-templates/resets',
  callers: ['owner', 'office'],
  body: z.strictObject({ kind }),
  answers: sameForPriced(letterTemplateSchema),
});

export const previewLetter = endpoint({
  name: 'previewLetter',
  summary: 'A letter with these words as it would leave, filled with examples',
  method: 'post',
  path: '/api/letter-templates/previews',
  callers: ['owner', 'office'],
  body: wordsOfKind,
  answers: sameForPriced(letterPreviewSchema),
});

export const listGivenUpLetters = endpoint({
  name: 'listGivenUpLetters',
  summary: 'Letters that could not be delivered and were given up, the newest first',
  method: 'get',
  path: '/api/letters/given-up',
  callers: ['owner', 'office'],
  answers: sameForPriced(z.strictObject({ items: z.array(givenUpLetterSchema) })),
});

export const sendLetterAgain = endpoint({
  name: 'sendLetterAgain',
  summary: 'Try to deliver a letter again that was given up',
  method: 'post',
  path: '/api/letters/:letterId/sendings',
  callers: ['owner', 'office'],
  params: z.strictObject({ letterId: identifier }),
  answers: {},
});
