import {
  holdSlot,
  keepPlan,
  keepProgramme,
  keepShop,
  readProgramme,
  readShop,
  readSolution,
  readWhatIf,
  releaseSlot,
  solveProgramme,
  stopSolution,
} from '#shared/programme/programme-endpoints';
import { mount, type Route } from '../platform/http/mount';
import type { HoldService } from './hold-service';
import { standingProgramme, standingShop } from './standing-presenter';
import type { ProgrammeService } from './programme-service';
import type { ShopService } from './shop-service';
import type { SolutionService } from './solution-service';
import type { WhatIfService } from './what-if-service';

interface Services {
  readonly shops: ShopService;
  readonly programmes: ProgrammeService;
  readonly solutions: SolutionService;
  readonly holds: HoldService;
  readonly whatIfs: WhatIfService;
}

const shopRoutes = ({ shops }: Services): Route[] => [
  mount(readShop, ({ actor }) => shops.read(actor.workshopId)),
  mount(keepShop, ({ actor, version, body }) => shops.keep(actor, version, body), standingShop),
];

const solutionRoutes = ({ solutions }: Services): Route[] => [
  mount(solveProgramme, ({ actor, params, body }) => solutions.begin(actor, params.estimateId, body)),
  mount(readSolution, ({ actor, params }) => solutions.read(actor.workshopId, params.solutionId)),
  mount(stopSolution, ({ actor, params }) => solutions.stop(actor.workshopId, params.solutionId)),
];

export const programmeRoutes = (services: Services): Route[] => [
  ...shopRoutes(services),
  mount(readProgramme, ({ actor, params }) => services.programmes.read(actor.workshopId, params.estimateId)),
  mount(
    keepProgramme,
    ({ actor, params, version, body }) => services.programmes.keep(actor, { id: params.estimateId, version }, body),
    standingProgramme,
  ),
  mount(
    keepPlan,
    ({ actor, params, version, body }) => services.programmes.keepPlan(actor, { id: params.estimateId, version }, body),
    standingProgramme,
  ),
  ...solutionRoutes(services),
  mount(readWhatIf, ({ actor, params, body }) => services.whatIfs.ask(actor.workshopId, params.estimateId, body)),
  mount(holdSlot, ({ actor, params }) => services.holds.hold(actor, params.estimateId)),
  mount(releaseSlot, ({ actor, params }) => services.holds.release(actor, params.estimateId)),
];
