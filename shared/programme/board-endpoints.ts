import * as z from 'zod';
import { endpoint, sameForAll, sameForPriced } from '#shared/actor/endpoint';
import { identifier } from '#shared/problems/entry-schema';
import { asPlannedSchema, benchDaySchema, benchTaskSchema, markSchema } from '#shared/programme/bench-day-schema';
import { boardSchema } from '#shared/programme/board-schema';
import {
  feedEntrySchema,
  feedSecret,
  calendarFeedSchema,
  newCalendarFeedSchema,
} from '#shared/programme/calendar-feed-schema';
import { calendarDay } from '#shared/programme/shop-schema';

const oneFeed = z.strictObject({ feedId: identifier });

export const readBoard = endpoint({
  name: 'readBoard',
  summary:
    'All accepted work and held offers on one calendar, with the load by grade and week and whatever is promised twice',
  method: 'get',
  path: '/api/programme/board',
  callers: ['owner', 'estimator', 'office'],
  query: z.strictObject({ from: calendarDay.optional(), weeks: z.coerce.number().int().min(1).max(104).default(13) }),
  answers: sameForPriced(boardSchema),
});

export const readBenchDay = endpoint({
  name: 'readBenchDay',
  summary: 'What one person does on a day, in order; who only works at the bench reads their own',
  method: 'get',
  path: '/api/programme/bench-day',
  callers: ['owner', 'estimator', 'office', 'bench'],
  query: z.strictObject({ day: calendarDay.optional(), personId: identifier.optional() }),
  answers: sameForAll(benchDaySchema),
});

export const markTask = endpoint({
  name: 'markTask',
  summary: 'Say that a task was started or finished, or take that back; the same twice is harmless',
  method: 'post',
  path: '/api/estimates/:estimateId/programme/marks',
  callers: ['owner', 'estimator', 'bench'],
  params: z.strictObject({ estimateId: identifier }),
  body: markSchema,
  answers: sameForAll(benchTaskSchema),
});

export const markAsPlanned = endpoint({
  name: 'markAsPlanned',
  summary:
    'Say of tasks that they went as planned: begun and, where that is over, finished at their planned times; what is marked already or was not to begin yet stays as it is',
  method: 'post',
  path: '/api/estimates/:estimateId/programme/marks/as-planned',
  callers: ['owner', 'estimator', 'bench'],
  params: z.strictObject({ estimateId: identifier }),
  body: asPlannedSchema,
  answers: sameForAll(z.strictObject({ marked: z.int() })),
});

export const listFeeds = endpoint({
  name: 'listFeeds',
  summary: 'The calendars that other programs may read; who only works at the bench sees their own',
  method: 'get',
  path: '/api/programme/feeds',
  callers: ['owner', 'estimator', 'office', 'bench'],
  answers: sameForAll(z.strictObject({ items: z.array(calendarFeedSchema) })),
});

export const makeFeed = endpoint({
  name: 'makeFeed',
  summary:
    'Make a calendar for other programs, or give it another address; the browser makes the id, the secret address is shown this once',
  method: 'put',
  path: '/api/programme/feeds/:feedId',
  callers: ['owner', 'estimator', 'office', 'bench'],
  params: oneFeed,
  body: feedEntrySchema,
  answers: sameForAll(newCalendarFeedSchema),
});

export const revokeFeed = endpoint({
  name: 'revokeFeed',
  summary: 'Take a calendar back: its address leads nowhere from now on',
  method: 'delete',
  path: '/api/programme/feeds/:feedId',
  callers: ['owner', 'estimator', 'office', 'bench'],
  params: oneFeed,
  answers: sameForAll(calendarFeedSchema),
});

export const readFeed = endpoint({
  name: 'readFeed',
  summary: 'A calendar by its secret address (RFC 5545); the secret stands in the query, which no log keeps',
  method: 'get',
  path: '/api/calendar-feeds/bolewright.ics',
  callers: 'anyone',
  query: z.strictObject({ secret: feedSecret }),
  media: 'text/calendar',
  answers: { public: z.unknown() },
});
