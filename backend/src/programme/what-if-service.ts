import { currencyDigits } from '#shared/money/currency-digits';
import type { Draft } from '#shared/estimates/draft';
import { zonesOfLot } from '#shared/estimates/zones-of-lot';
import type { ProgrammeInputs } from '#shared/programme/programme-inputs';
import type { Shop } from '#shared/programme/shop';
import type { WhatIf } from '#shared/programme/what-if';
import type { WhatIfAnswer } from '#shared/programme/what-if-schema';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { Rejection } from '#shared/problems/rejection';
import type { Estimates } from '../estimates';
import { refuseFarInputs } from './refuse-far-inputs';
import { programmeIn, type ProgrammeContexts } from './programme-context';
import { presentFrame } from './programme-presenter';

interface Parts {
  readonly contexts: ProgrammeContexts;
  readonly priced: Estimates['priced'];
}

/** The draft with the zones of some lots on other build-ups; what the draft or the card does not hold is refused. */
function draftWith(draft: Draft, lots: WhatIf['lots'], { buildUps }: RateCard): Draft {
  const buildUpOf = new Map<string, string>();
  lots.forEach(({ lotId, buildUpId }, at) => {
    const zones = zonesOfLot(draft.members, lotId);
    const isKnown = buildUps.buildUps.some(({ id }) => id === buildUpId);
    if (zones.length === 0 || !isKnown) throw unknownLot(at);
    for (const { zone } of zones) buildUpOf.set(zone.id, buildUpId);
  });
  const members = draft.members.map((member) => ({
    ...member,
    zones: member.zones.map((zone) => ({ ...zone, buildUpId: buildUpOf.get(zone.id) ?? zone.buildUpId })),
  }));
  return { ...draft, members };
}

const unknownLot = (at: number): Rejection =>
  new Rejection('invalid', 'problem-invalid', {
    complaints: [{ path: ['lots', at], code: 'programme-lot-unknown', values: {} }],
  });

/** Further people from the start, each with one grade and the workshop's hours. */
const shopWith = (shop: Shop, gradeIds: readonly string[]): Shop => ({
  ...shop,
  people: [
    ...shop.people,
    ...gradeIds.map((gradeId, at) => ({
      ...{ id: `further-${String(at + 1)}`, name: gradeId, gradeIds: [gradeId] },
      ...{ hours: null, absences: [], membershipId: null },
    })),
  ],
});

const inputsWith = (inputs: ProgrammeInputs, { day, climate }: WhatIf): ProgrammeInputs => ({
  ...inputs,
  day: day ?? inputs.day,
  climate: climate ?? inputs.climate,
});

/** What would be planned if something were another, and what the difference costs. Nothing is kept. */
export class WhatIfService {
  constructor(private readonly parts: Parts) {}

  async ask(workshopId: string, estimateId: string, asked: WhatIf): Promise<WhatIfAnswer> {
    const standing = await this.parts.contexts.of(workshopId, estimateId);
    const inputs = inputsWith(standing.inputs, asked);
    refuseFarInputs(inputs, { today: standing.today, timeZone: standing.frame.timeZone });
    const context = await this.parts.contexts.of(workshopId, estimateId, inputs);
    const { card, frame } = context;
    const draft = draftWith(context.draft, asked.lots, card);
    const shop = shopWith(context.shop, asked.furtherGradeIds);
    const { request, items, findings } = programmeIn(context, 'today', { draft, shop, inputs });
    const { currency } = context.whole.estimate;
    const price = (of: Draft) => this.parts.priced({ draft: of, choice: inputs.choice, card, currency });
    const [before, after] = [await price(context.draft), await price(draft)];
    return {
      ...presentFrame(frame),
      ...{ request, items: [...items] as WhatIfAnswer['items'], findings: [...findings] as WhatIfAnswer['findings'] },
      cost_minor: after.cost.price.cost_minor,
      costDifference_minor: after.cost.price.cost_minor - before.cost.price.cost_minor,
      gross_minor: after.price.gross_minor,
      grossDifference_minor: after.price.gross_minor - before.price.gross_minor,
      rates: card.money.grades.map(({ id, costPerHour }) => ({ gradeId: id, costPerHour })),
      setUp_hours: card.buildUps.setUp_hours,
      digits: currencyDigits(currency),
    };
  }
}
