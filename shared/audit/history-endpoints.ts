import { historyLinesSchema, historyPageSchema, historyQuery } from '#shared/audit/history-schema';
import { endpoint } from '#shared/actor/endpoint';

export const listHistory = endpoint({
  name: 'listHistory',
  summary: 'What was done in the workshop, or on one job, newest first.',
  method: 'get',
  path: '/api/history',
  callers: ['owner', 'estimator', 'office'],
  query: historyQuery,
  answers: { cost: historyPageSchema, price: historyLinesSchema },
});
