import {
  beginEstimate,
  changeEstimate,
  listEstimates,
  readAlternatives,
  readEstimate,
  takeRateCard,
  tellPresence,
} from '#shared/estimates/estimates-endpoints';
import { mount, type Route } from '../platform/http/mount';
import { presentSummary } from './estimate-presenter';
import type { EstimateService } from './estimate-service';
import type { PresenceService } from './presence-service';

export const estimateRoutes = (estimates: EstimateService, presences: PresenceService): Route[] => [
  mount(listEstimates, async ({ actor, params }) => {
    const rows = await estimates.ofJob(actor.workshopId, params.jobId);
    return { items: rows.map(presentSummary) };
  }),
  mount(beginEstimate, async ({ actor, params, body }) => {
    const at = { jobId: params.jobId, id: params.estimateId };
    return presentSummary(await estimates.begin(actor, at, { title: body.title, kind: 'estimate' }));
  }),
  mount(readEstimate, ({ actor, params }) => estimates.read(actor, params.estimateId)),
  mount(
    changeEstimate,
    ({ actor, params, body }) => estimates.change(actor, params.estimateId, body.changes),
    (standing: unknown) => standing,
  ),
  mount(takeRateCard, ({ actor, params, version, body }) =>
    estimates.takeCard(actor, { id: params.estimateId, version }, body.rateCardId),
  ),
  mount(readAlternatives, async ({ actor, params }) => {
    const whole = await estimates.whole(actor.workshopId, params.estimateId);
    return { items: await estimates.alternatives(whole) };
  }),
  mount(tellPresence, ({ actor, params }) => presences.tell(actor, params.estimateId)),
];
