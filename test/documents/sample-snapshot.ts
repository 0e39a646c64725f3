import { calculatorVersion } from '#shared/estimates/calculator-version';
import { alternativeTotal } from '#shared/estimates/alternative-total';
import type { Choice, Draft } from '#shared/estimates/draft';
import { estimateFigures, prepareEstimate } from '#shared/estimates/estimate-figures';
import type { Figures } from '#shared/estimates/figures';
import { riskOf } from '#shared/estimates/risk/risk-of';
import type { Snapshot, SnapshotWorkshop } from '#shared/estimates/snapshot';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { startCard } from '#shared/rate-cards/start-card';

export const sampleWorkshop: SnapshotWorkshop = {
  name: 'Reiher & Töchter, carvers and gilders',
  addressLines: ['Lindengasse 14', '1070 Wien', 'Austria'],
  telephone: '+43 1 555 0100',
  email: 'workshop@reiher.example',
  taxRegistration: 'ATU00000000',
  currency: 'EUR',
  locale: 'en-GB',
  lengthUnit: 'mm',
  timeZone: 'Europe/Vienna',
  paperSize: 'A4',
  country: 'AT',
};

const figuresOf = (draft: Draft, choice: Choice, at: { card: RateCard; currency: string }): Figures => {
  const prepared = prepareEstimate({ draft, choice, ...at });
  return estimateFigures(prepared, riskOf(prepared.risk));
};

/** An issue of a draft as it would be frozen, with every alternative worked by itself. */
export function sampleSnapshot(
  draft: Draft,
  rest: { workshop?: Partial<SnapshotWorkshop>; card?: RateCard; choice?: Choice; issuedAt?: string } = {},
): Snapshot {
  const workshop = { ...sampleWorkshop, ...rest.workshop };
  const card = rest.card ?? startCard;
  const choice = rest.choice ?? [];
  const at = { card, currency: workshop.currency };
  const base = figuresOf(draft, [], at);
  return {
    snapshotVersion: 1,
    calculatorVersion,
    workshop,
    client: {
      name: 'Museum of Interiors',
      contact: 'Ms Łucja Żółtowska',
      address: 'Schlossplatz 1\n5020 Salzburg\nAustria',
    },
    job: { number: '2026-014', title: 'Pier table, paired herons', reference: 'PO 7781', site: 'Garden room' },
    estimate: { id: 'estimate-1', number: 'E-2026-031', letter: 'B' },
    issuedAt: rest.issuedAt ?? '2026-03-02T09:30:00.000Z',
    issuedOn: '2026-03-02',
    issuedBy: 'Anna Reiher',
    validUntil: '2026-05-01',
    leafValidUntil: '2026-04-01',
    note: '',
    draft,
    card,
    choice,
    figures: choice.length === 0 ? base : figuresOf(draft, choice, at),
    alternatives: draft.settings.alternatives.map((alternative) =>
      alternativeTotal({ draft, alternative }, base, figuresOf(draft, [alternative.id], at)),
    ),
  };
}
