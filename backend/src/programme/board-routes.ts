import {
  listFeeds,
  makeFeed,
  markAsPlanned,
  markTask,
  readBenchDay,
  readBoard,
  readFeed,
  revokeFeed,
} from '#shared/programme/board-endpoints';
import { mount, type Route } from '../platform/http/mount';
import type { BenchService } from './bench-service';
import type { BoardService } from './board-service';
import { presentFeed, type FeedService } from './feed-service';
import type { MarkService } from './mark-service';

interface Services {
  readonly board: BoardService;
  readonly bench: BenchService;
  readonly marks: MarkService;
  readonly feeds: FeedService;
}

export const boardRoutes = ({ board, bench, marks, feeds }: Services): Route[] => [
  mount(readBoard, ({ actor, query }) => board.read(actor.workshopId, query)),
  mount(readBenchDay, ({ actor, query }) => bench.day(actor, query)),
  mount(markTask, ({ actor, params, body }) => marks.mark(actor, params.estimateId, body)),
  mount(markAsPlanned, ({ actor, params, body }) => marks.asPlanned(actor, params.estimateId, body.taskIds)),
  mount(listFeeds, async ({ actor }) => ({ items: (await feeds.list(actor)).map(presentFeed) })),
  mount(makeFeed, ({ actor, params, body }) => feeds.make(actor, params.feedId, body)),
  mount(revokeFeed, async ({ actor, params }) => presentFeed(await feeds.revoke(actor, params.feedId))),
  mount(readFeed, ({ query }) => feeds.file(query.secret)),
];
