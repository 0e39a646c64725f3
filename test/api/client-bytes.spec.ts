import type { Response } from 'supertest';
import {
  acceptIssue,
  priceClientChoice,
  readClientIssue,
  readClientOverview,
  readClientPaper,
  reviewClientChoice,
} from '#shared/client-page/client-issues-endpoints';
import type { CostFigures } from '#shared/estimates/figures';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { textOfPaper } from '../documents/paper-text';
import { acceptanceOf, clientOf, sampleChoices, type SampleChoices } from './sample-client-visit';
import { startApi, type Api } from './start-api';
import type { Visitor } from './visitor';

/**
 * A workshop whose rates are figures that stand nowhere else. Whatever a client is sent is searched for them, for every figure of the
 * cost side as the issue froze it, and for the names under which such figures are kept (ASVS 15.3.1).
 */
const canaries = { hour: '41.37', overhead: '17.93', margin: '23.71', share: '6.19', leaf: '37.43' };

let api: Api;
let sample: SampleChoices;
let visitor: Visitor;

function withCanaries(card: RateCard): RateCard {
  const { money, leaf } = card;
  return {
    ...card,
    leaf: { ...leaf, products: leaf.products.map((product) => ({ ...product, price: canaries.leaf })) },
    money: {
      ...money,
      grades: money.grades.map((grade) => ({ ...grade, costPerHour: canaries.hour })),
      overhead: { way: 'per-hour', perHour: canaries.overhead },
      profit: { way: 'margin', percent: canaries.margin },
      contingency: { ...money.contingency, way: 'share', percent: canaries.share },
    },
  };
}

beforeAll(async () => {
  api = await startApi();
  const { id, content } = await api.app.rateCards.service.inForce(api.ours.id);
  await api.platform.database.execute(
    'UPDATE rate_cards SET content = :content, version = version + 1 WHERE id = :id',
    {
      id,
      content: JSON.stringify(withCanaries(content)),
    },
  );
  sample = await sampleChoices(api.ours, api);
  visitor = await clientOf(api.ours, api, sample.issueId);
}, 60_000);
afterAll(() => api.stop());

const params = () => ({ issueId: sample.issueId });
const choice = () => [sample.oil, sample.crate];
const asked: Record<string, () => Promise<Response>> = {
  overview: async () => visitor.call(readClientOverview),
  issue: async () => visitor.call(readClientIssue, { params: params() }),
  prices: async () => visitor.call(priceClientChoice, { params: params(), body: { choice: choice() } }),
  review: async () => visitor.call(reviewClientChoice, { params: params(), body: { choice: choice() } }),
  paper: async () => visitor.call(readClientPaper, { params: params() }),
  'paper of a choice': async () =>
    visitor.call(readClientPaper, { params: params(), query: { choice: choice().join(',') } }),
  acceptance: async () => visitor.call(acceptIssue, await acceptanceOf(visitor, sample.issueId, choice())),
};

const textOf = ({ body, text }: Response): string => (Buffer.isBuffer(body) ? textOfPaper(body) : text);

/** Every number of a value, however deep. */
function numbersOf(value: unknown): number[] {
  if (typeof value === 'number') return [value];
  return value && typeof value === 'object' ? Object.values(value).flatMap(numbersOf) : [];
}

function namesOf(value: unknown): string[] {
  if (!value || typeof value !== 'object') return [];
  const own = Array.isArray(value) ? [] : Object.keys(value);
  return [...own, ...Object.values(value).flatMap(namesOf)];
}

/** Figures of the cost side that are large or odd enough not to be something else by chance. */
const isTelling = (figure: number): boolean => Math.abs(figure) >= 1_000 || !Number.isInteger(figure * 4);

async function costFigures(): Promise<{ cost: CostFigures; open: number[] }> {
  const frozen = await api.app.estimates.frozen.read(api.ours.id, sample.issueId);
  const chosen = await api.app.estimates.frozen.chosen(frozen, choice());
  const { price, stages } = frozen.snapshot.figures;
  const open = numbersOf([price.lines, price.taxes, price.net_minor, price.tax_minor, price.gross_minor, stages]);
  return { cost: frozen.snapshot.figures.cost, open: [...open, ...numbersOf(chosen.figures.price)] };
}

test('the canaries are in the reckoning, so that there is something to find', async () => {
  const { snapshot } = await api.app.estimates.frozen.read(api.ours.id, sample.issueId);
  const kept = JSON.stringify(snapshot);
  for (const canary of Object.values(canaries)) expect(kept).toContain(canary);
  expect((await costFigures()).cost.price.cost_minor).toBeGreaterThan(10_000);
});

test.each(Object.keys(asked))('%s holds nothing of cost, margin, hours or rates', async (name) => {
  const response = await asked[name]();
  expect(response.status).toBe(200);
  const text = textOf(response);
  expect(text.length).toBeGreaterThan(100);
  for (const canary of Object.values(canaries)) expect(text).not.toContain(canary);
  if (Buffer.isBuffer(response.body)) return;
  const { cost, open } = await costFigures();
  const secret = new Set(numbersOf(cost).filter((figure) => isTelling(figure) && !open.includes(figure)));
  expect(secret.size).toBeGreaterThan(20);
  expect(numbersOf(response.body).filter((figure) => secret.has(figure))).toEqual([]);
  const names = namesOf(response.body);
  expect(names.filter((one) => /cost|margin|mark_?up|hour|rate|overhead|contingency|profit|grade/i.test(one))).toEqual(
    [],
  );
});
