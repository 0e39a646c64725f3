import * as z from 'zod';
import { questionSchema, questionText } from '#shared/agreements/question-schema';
import { endpoint, sameForPriced } from '#shared/actor/endpoint';
import { identifier } from '#shared/problems/entry-schema';

const oneJob = z.strictObject({ jobId: identifier });

export const listQuestions = endpoint({
  name: 'listQuestions',
  summary: 'What the client of a job asked and what was answered, in order of time',
  method: 'get',
  path: '/api/jobs/:jobId/questions',
  callers: ['owner', 'estimator', 'office'],
  params: oneJob,
  answers: sameForPriced(z.strictObject({ items: z.array(questionSchema) })),
});

export const answerQuestion = endpoint({
  name: 'answerQuestion',
  summary: 'Write to the client of a job about one of its issues; it stands in the thread and goes out by mail',
  method: 'post',
  path: '/api/jobs/:jobId/questions',
  callers: ['owner', 'estimator', 'office'],
  params: oneJob,
  body: z.strictObject({ issueId: identifier, text: questionText }),
  answers: sameForPriced(questionSchema),
});
