import type { Accounts } from '../accounts';
import type { Audit } from '../audit';
import type { Estimates } from '../estimates';
import type { Jobs } from '../jobs';
import type { Route } from '../platform/http/mount';
import type { Platform } from '../platform/platform';
import type { RateCards } from '../rate-cards';
import { BenchService } from './bench-service';
import { boardRoutes } from './board-routes';
import { BoardService } from './board-service';
import { FeedRepository } from './feed-repository';
import { FeedService } from './feed-service';
import { HoldService } from './hold-service';
import { MarkRepository } from './mark-repository';
import { MarkService } from './mark-service';
import { ProgrammeContexts } from './programme-context';
import { ProgrammeRepository } from './programme-repository';
import { programmeRoutes } from './programme-routes';
import { ProgrammeService } from './programme-service';
import { PromisedJobs } from './promised-jobs';
import { ShopRepository } from './shop-repository';
import { ShopService } from './shop-service';
import { SolutionRepository } from './solution-repository';
import { SolutionService } from './solution-service';
import { WhatIfService } from './what-if-service';

export type { HoldService } from './hold-service';
export type { MarkService } from './mark-service';
export type { ProgrammeService } from './programme-service';
export type { ShopService } from './shop-service';

/** What other features and the start data may ask of this one. */
export interface ProgrammeFeature {
  readonly shops: ShopService;
  readonly programmes: ProgrammeService;
  readonly holds: HoldService;
  readonly marks: MarkService;
  readonly board: BoardService;
  readonly bench: BenchService;
  readonly routes: readonly Route[];
}

/** What this feature stands on. */
export interface ProgrammeNeeds {
  readonly accounts: Accounts;
  readonly audit: Audit;
  readonly rateCards: RateCards;
  readonly jobs: Jobs;
  readonly estimates: Estimates;
}

function openParts({ database, clock }: Platform, needs: ProgrammeNeeds) {
  const programmes = new ProgrammeRepository(database);
  const marks = new MarkRepository(database);
  const base = {
    ...{
      programmes,
      marks,
      clock,
      promises: new PromisedJobs(programmes),
      estimates: needs.estimates,
      jobs: needs.jobs,
    },
    ...{ cards: needs.rateCards.service, workshops: needs.accounts.workshops, audit: needs.audit.service },
  };
  const shops = new ShopService({ ...base, shops: new ShopRepository(database), people: needs.accounts.people });
  const contexts = new ProgrammeContexts({ ...base, shops });
  return { ...base, shops, contexts };
}

/** The programme: dated plans of estimates, the workshop's board, the day at the bench, calendars for other programs. */
export function openProgramme(platform: Platform, needs: ProgrammeNeeds): ProgrammeFeature {
  const { database, tasks, log, config } = platform;
  const parts = openParts(platform, needs);
  const programmes = new ProgrammeService(parts);
  const holds = new HoldService({ ...parts, service: programmes });
  const solutions = new SolutionService({
    ...parts,
    programmes,
    solutions: new SolutionRepository(database),
    tasks,
    log,
  });
  const whatIfs = new WhatIfService({ ...parts, priced: needs.estimates.priced });
  const board = new BoardService(parts);
  const bench = new BenchService(parts);
  const marks = new MarkService({ ...parts, bench });
  const feeds = new FeedService({
    ...{ ...parts, bench, config },
    feeds: new FeedRepository(database),
    people: needs.accounts.people,
  });
  const routes = [
    ...programmeRoutes({ shops: parts.shops, programmes, solutions, holds, whatIfs }),
    ...boardRoutes({ board, bench, marks, feeds }),
  ];
  return { shops: parts.shops, programmes, holds, marks, board, bench, routes };
}
