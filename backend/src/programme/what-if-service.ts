import { currencyDigits } from '#shared/money/currency-digits';
import type { BuildUp } from '#shared/buildups/buildup';
import type { Draft } from '#shared/estimates/draft';
import type { Zone } from '#shared/estimates/member';
import { zonesOfLot } from '#shared/estimates/zones-of-lot';
import type { ProgrammeInputs } from '#shared/programme/programme-inputs';
import type { Shop } from '#shared/programme/shop';
import { buildUpOnSize } from '#shared/programme/build-up-on-size';
import type { LotOtherwise, WhatIf } from '#shared/programme/what-if';
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

/** A draft with the card it is worked from. */
interface Worked {
  readonly draft: Draft;
  readonly card: RateCard;
}

/** The build-up a zone has where its lot is worked otherwise; null where card or zone do not allow it. */
function buildUpFor({ buildUpId: ownId }: Zone, { buildUpId, onlySize }: LotOtherwise, { buildUps }: RateCard) {
  const find = (id: string) => buildUps.buildUps.find((buildUp) => buildUp.id === id) ?? null;
  const [own, other] = [find(ownId), find(buildUpId)];
  if (!onlySize || !other) return other;
  return own && buildUpOnSize(own, other);
}

/** The draft with the zones of some lots on other build-ups, and the card with those that are made for it; what the draft or the card does not hold is refused. */
function workedOtherwise({ draft, card }: Worked, lots: WhatIf['lots']): Worked {
  const made = new Map<string, BuildUp>();
  const buildUpOf = new Map<string, string>();
  lots.forEach((lot, at) => {
    const zones = zonesOfLot(draft.members, lot.lotId);
    if (zones.length === 0) throw unknownLot(at);
    for (const { zone } of zones) {
      const buildUp = buildUpFor(zone, lot, card);
      if (!buildUp) throw unknownLot(at);
      buildUpOf.set(zone.id, buildUp.id);
      if (lot.onlySize) made.set(buildUp.id, buildUp);
    }
  });
  const members = draft.members.map((member) => ({
    ...member,
    zones: member.zones.map((zone) => ({ ...zone, buildUpId: buildUpOf.get(zone.id) ?? zone.buildUpId })),
  }));
  const buildUps = { ...card.buildUps, buildUps: [...card.buildUps.buildUps, ...made.values()] };
  return { draft: { ...draft, members }, card: { ...card, buildUps } };
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
    const otherwise = workedOtherwise(context, asked.lots);
    const shop = shopWith(context.shop, asked.furtherGradeIds);
    const { request, items, findings } = programmeIn(context, context.now_minutes, { ...otherwise, shop, inputs });
    const { currency } = context.whole.estimate;
    const price = (of: Worked) =>
      this.parts.priced({ draft: of.draft, card: of.card, choice: inputs.choice, currency });
    const [before, after] = [await price(context), await price(otherwise)];
    return {
      ...presentFrame(frame),
      ...{ request, items: [...items] as WhatIfAnswer['items'], findings: [...findings] as WhatIfAnswer['findings'] },
      cost_minor: after.cost.price.cost_minor,
      costDifference_minor: after.cost.price.cost_minor - before.cost.price.cost_minor,
      gross_minor: after.price.gross_minor,
      grossDifference_minor: after.price.gross_minor - before.price.gross_minor,
      rates: card.money.grades.map(({ id, costPerHour }) => ({ gradeId: id, costPerHour })),
      setUp_hours: card.buildUps.setUp_hours,
      overtime_percent: context.shop.overtime_percent,
      digits: currencyDigits(currency),
    };
  }
}
