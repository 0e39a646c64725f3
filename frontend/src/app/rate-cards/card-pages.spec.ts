import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { provideRouter, Router, TitleStrategy, withComponentInputBinding, withRouterConfig } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import type { Role } from '#shared/actor/role';
import { cardDifferences } from '#shared/rate-cards/card-differences';
import type { CardEffectsAnswer } from '#shared/rate-cards/card-effects-schema';
import type { RateCardSummary } from '#shared/rate-cards/rate-card-summary-schema';
import type { WholeRateCard } from '#shared/rate-cards/rate-cards-endpoints';
import { startCard } from '#shared/rate-cards/start-card';
import { problemSchema } from '#shared/problems/problem-schema';
import { signIn, words } from '../../test/sign-in';
import { NOW } from '../core/now';
import { ProblemError } from '../core/problems/problem-error';
import { PageTitle } from '../core/routing/page-title';
import { Confirm } from '../ui/dialog/confirm';
import { RateCardCalls, type CardEntries, type SeenCard } from './rate-card-calls';
import { rateCardsRoutes } from './rate-cards-routes';

const id = (number: number) => `018f0000-0000-7000-8000-0000000000${number}`;
const [inForceId, draftId] = [id(41), id(42)];

const whole = (given: Partial<WholeRateCard>): WholeRateCard => ({
  ...{ id: draftId, version: 1, name: 'Spring', state: 'draft', from: null, basedOnId: inForceId },
  changedAt: '2026-03-01T08:00:00.000Z',
  content: startCard as WholeRateCard['content'],
  ...given,
});

const effect = {
  ...{
    estimateId: id(51),
    jobId: id(52),
    number: '2026-004-1',
    title: 'Base',
    jobTitle: 'Pier table',
    currency: 'EUR',
  },
  ...{ before_minor: 235_257, after_minor: 250_833, findings: [] },
  lines: [{ lineId: 'a', member: 'Frieze', kind: 'gilding', name: null, before_minor: 57_721, after_minor: 73_297 }],
};

/** The server's side of one workshop's cards, in memory. */
class CardsServer {
  cards: WholeRateCard[] = [
    whole({ id: inForceId, name: 'House values', state: 'in-force', from: '1970-01-01', basedOnId: null }),
    whole({}),
  ];
  effectsNow: CardEffectsAnswer[] = [
    { state: 'done', isCurrent: true, worked: 1, total: 1, workedAt: '2026-03-02T08:00:00.000Z', effects: [effect] },
  ];
  readonly asked: string[] = [];
  readonly kept: CardEntries[] = [];
  readonly comparedFrom: string[] = [];
  fill = jest.fn<Promise<RateCardSummary>, [SeenCard, File]>();

  of = (cardId: string): WholeRateCard => this.cards.find((card) => card.id === cardId) ?? whole({ id: cardId });
  list = () => Promise.resolve({ items: this.cards.map(summaryOf), next: null, count: 2, countIsExact: true });
  read = (cardId: string) => Promise.resolve(this.of(cardId));
  copy = (fromId: string, draft: { id: string; name: string }) => {
    this.asked.push(`copy ${fromId}`);
    this.cards.push(whole({ ...draft, content: this.of(fromId).content }));
    return Promise.resolve(summaryOf(this.of(draft.id)));
  };
  keep = ({ id: cardId, version }: SeenCard, entries: CardEntries) => {
    this.kept.push(entries);
    return this.put({
      ...this.of(cardId),
      ...(entries as Pick<WholeRateCard, 'name' | 'content'>),
      version: version + 1,
    });
  };
  differences = (cardId: string, from: string) => {
    this.comparedFrom.push(from);
    const [against, card] = [this.of(inForceId), this.of(cardId)];
    return Promise.resolve({
      against: summaryOf(against),
      differences: cardDifferences(against.content, card.content),
    });
  };
  workEffects = (cardId: string) => {
    this.asked.push(`effects ${cardId}`);
    return this.effects();
  };
  effects = () => Promise.resolve((this.effectsNow.length > 1 ? this.effectsNow.shift() : this.effectsNow[0])!);
  putInForce = ({ id: cardId, version }: SeenCard, from: string) => {
    this.asked.push(`in force ${from}`);
    return this.put({ ...this.of(cardId), state: 'set', from, version: version + 1 });
  };

  private put(card: WholeRateCard): Promise<RateCardSummary> {
    this.cards = this.cards.map((one) => (one.id === card.id ? card : one));
    return Promise.resolve(summaryOf(card));
  }
}

const routes = [{ path: 'rates', children: rateCardsRoutes }];

const summaryOf = ({ content: _content, ...summary }: WholeRateCard): RateCardSummary => summary;

describe('The pages of rate cards', () => {
  let server: CardsServer;
  let harness: RouterTestingHarness;
  const confirm = { ask: jest.fn(() => Promise.resolve(true)) };
  const element = () => harness.routeNativeElement?.parentElement as HTMLElement;
  const text = () => element().textContent?.replace(/\s+/g, ' ') ?? '';
  const settle = async (wait_ms = 0) => {
    await new Promise((resolve) => setTimeout(resolve, wait_ms));
    await (harness.fixture as ComponentFixture<unknown>).whenStable();
  };
  const button = (name: string | RegExp) =>
    [...element().querySelectorAll('button')].find((one) => (one.textContent ?? '').trim().match(name));

  async function open(address: string, roles: readonly Role[] = ['owner']) {
    server = new CardsServer();
    confirm.ask.mockClear();
    TestBed.configureTestingModule({
      providers: [
        ...[
          words,
          provideRouter(routes, withComponentInputBinding(), withRouterConfig({ paramsInheritanceStrategy: 'always' })),
        ],
        { provide: RateCardCalls, useValue: server },
        { provide: Confirm, useValue: confirm },
        { provide: NOW, useValue: () => new Date('2026-03-02T10:00:00Z') },
        { provide: TitleStrategy, useClass: PageTitle },
      ],
    });
    signIn(roles);
    harness = await RouterTestingHarness.create(address);
    await settle();
    await settle();
  }

  it('list the cards with their state, drafts first, and mark the one in force', async () => {
    await open('/rates');
    const rows = [...element().querySelectorAll('tbody tr')];
    expect(rows.map((row) => row.querySelector('a')?.textContent)).toEqual(['Spring', 'House values']);
    expect(rows.map((row) => row.classList.contains('now'))).toEqual([false, true]);
    expect(rows.map((row) => row.querySelector('.from')?.textContent)).toEqual(['', 'the beginning']);
  });

  it('begin a draft from the card in force, and open it', async () => {
    await open('/rates');
    button('Change the rates')?.click();
    await settle();
    expect(server.asked).toEqual([`copy ${inForceId}`]);
    expect(server.cards.at(-1)?.name).toBe('Rates of 2 Mar 2026');
    expect(TestBed.inject(Router).url).toBe(`/rates/${server.cards.at(-1)?.id}/labour`);
  });

  it('name a second draft of one day apart from the first', async () => {
    await open('/rates');
    server.cards.push(whole({ id: id(43), name: 'Rates of 2 Mar 2026' }));
    button('Change the rates')?.click();
    await settle();
    expect(server.cards.at(-1)?.name).toBe('Rates of 2 Mar 2026, 2');
  });

  it('let an estimator read and change nothing', async () => {
    await open(`/rates/${draftId}/labour`, ['estimator']);
    expect(text()).toContain('Gilder');
    expect(text()).toContain('The working day8 h');
    expect(element().querySelectorAll('input, select, .tools button')).toHaveLength(0);
    expect(element().querySelectorAll('td[aria-readonly]').length).toBeGreaterThan(0);
  });

  it('leave a card in force as it is, for owners too', async () => {
    await open(`/rates/${inForceId}/money`);
    expect(text()).toContain('Figures to begin with, in EUR: nobody at this workshop has judged them yet.');
    expect(text()).toContain('A margin of 18% on the price is a mark-up of 21.95% on the cost.');
    expect(element().querySelectorAll('input, select')).toHaveLength(0);
    expect(button('Change the rates')).toBeDefined();
  });

  const cellOf = (content: string) =>
    [...element().querySelectorAll<HTMLElement>('td')].find((cell) => cell.textContent?.trim().startsWith(content))!;

  async function press(target: HTMLElement, key: string) {
    target.dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true }));
    await settle();
  }

  it('keep what is typed into a table, and say what it was', async () => {
    await open(`/rates/${draftId}/labour`);
    cellOf('33.00').click();
    await settle();
    await press(cellOf('33.00'), 'Enter');
    const editor = element().querySelector<HTMLInputElement>('td input')!;
    editor.value = '36.5';
    await press(editor, 'Enter');
    expect(cellOf('36.50').textContent).toContain('was 33.00');
    await settle(700);
    expect(server.kept.at(-1)?.content.money.grades[2]?.costPerHour).toBe('36.5');
  });

  it('take rows of a spreadsheet, below the last one too, as one step', async () => {
    await open(`/rates/${draftId}/labour`);
    cellOf('Improver').click();
    await settle();
    const clipboardData = { getData: () => 'Junior\t20.5\r\nFinisher\t27\r\nTurner\t30' };
    cellOf('Improver').dispatchEvent(Object.assign(new Event('paste', { bubbles: true }), { clipboardData }));
    await settle(700);
    const grades = server.kept.at(-1)?.content.money.grades.map(({ name, costPerHour }) => [name, costPerHour]);
    expect(grades?.slice(3)).toEqual([
      ['Junior', '20.5'],
      ['Finisher', '27'],
      ['Turner', '30'],
    ]);
    element().querySelector<HTMLButtonElement>('button[aria-label="Undo"]')?.click();
    await settle(700);
    expect(server.kept.at(-1)?.content).toEqual(startCard);
  });

  it('mark what cannot be read, in the table and beside the part, and keep nothing', async () => {
    await open(`/rates/${draftId}/labour`);
    cellOf('33.00').click();
    await settle();
    await press(cellOf('33.00'), 'Enter');
    const editor = element().querySelector<HTMLInputElement>('td input')!;
    editor.value = 'a lot';
    await press(editor, 'Enter');
    await settle(700);
    expect(cellOf('a lot').getAttribute('aria-invalid')).toBe('true');
    expect(element().querySelector('nav .here')?.textContent).toContain('1 to look at');
    expect(server.kept).toEqual([]);
  });

  it('draw the layers of a build-up as its steps are entered', async () => {
    await open(`/rates/${draftId}/build-ups`);
    const strip = () => element().querySelector('app-section-strip svg')?.getAttribute('aria-label');
    expect(strip()).toContain('Gesso (8)');
    cellOf('Gesso').click();
    await settle();
    const entries = [...element().querySelectorAll('app-step-editor app-card-entry')];
    const coats = entries.find((entry) => entry.querySelector('label')?.textContent?.trim() === 'Coats, plain');
    const input = coats!.querySelector('input')!;
    input.value = '11';
    input.dispatchEvent(new Event('change'));
    await settle();
    expect(strip()).toContain('Gesso (11)');
  });

  it('ask only for what means something: laying has no hours a square metre', async () => {
    await open(`/rates/${draftId}/build-ups`);
    const labels = () =>
      [...element().querySelectorAll('app-step-editor label')].map((label) => label.textContent?.trim());
    expect(labels()).toContain('A square metre and coat');
    cellOf('Wet and lay').click();
    await settle();
    expect(labels()).not.toContain('A square metre and coat');
    expect(labels()).toContain('Which laying');
  });

  it('show what a draft changes in the trade’s words, and in every open estimate', async () => {
    await open(`/rates/${draftId}/changes`);
    expect(text()).toContain('Nothing differs from House values.');
    expect(text()).toContain('2026-004-1 Pier table');
    expect(text()).toContain('€2,352.57');
    expect(text()).toContain('+€155.76');
    expect(text()).not.toContain('Frieze · Gilding');
    button('1 line')?.click();
    await settle();
    expect(text()).toContain('Frieze · Gilding');
  });

  it('have the effects worked out where nobody asked yet, and look until they are', async () => {
    const done = new CardsServer().effectsNow[0];
    await open('/rates');
    server.effectsNow = [
      { ...done, state: 'none', isCurrent: false, effects: [], workedAt: null },
      { ...done, state: 'waiting', worked: 0, total: 0, effects: [], workedAt: null },
      { ...done, state: 'working', worked: 1, total: 3, effects: [], workedAt: null },
      done,
    ];
    await harness.navigateByUrl(`/rates/${draftId}/changes`);
    await settle();
    expect(server.asked).toEqual([`effects ${draftId}`]);
    expect(button(/Put in force/)?.disabled).toBe(true);
    await settle(1100);
    expect(text()).toContain('1 of 3 worked out');
    await settle(1100);
    expect(text()).toContain('2026-004-1');
    expect(button(/Put in force/)?.disabled).toBe(false);
  });

  it('put a draft in force from the day chosen, once somebody is sure', async () => {
    await open(`/rates/${draftId}/changes`);
    const day = element().querySelector<HTMLInputElement>('input[type="date"]')!;
    expect([day.value, button(/Put in force/)?.textContent?.trim()]).toEqual(['2026-03-02', 'Put in force from today']);
    day.value = '2026-04-01';
    day.dispatchEvent(new Event('input'));
    await settle();
    expect(button(/Put in force/)?.textContent?.trim()).toBe('Put in force from 1 Apr 2026');
    expect(server.comparedFrom).toEqual(['2026-03-02', '2026-04-01']);
    button(/Put in force/)?.click();
    await settle();
    expect([confirm.ask.mock.calls.length, server.asked]).toEqual([1, ['in force 2026-04-01']]);
    expect(text()).toContain('set for a day');
  });

  it('tell of a day that is past beside it, and ask nothing', async () => {
    await open(`/rates/${draftId}/changes`);
    const day = element().querySelector<HTMLInputElement>('input[type="date"]')!;
    day.value = '2026-03-01';
    day.dispatchEvent(new Event('input'));
    await settle();
    button(/Put in force/)?.click();
    await settle();
    expect(text()).toContain('A rate card begins today or later.');
    expect([confirm.ask.mock.calls.length, server.asked, server.comparedFrom]).toEqual([0, [], ['2026-03-02']]);
  });

  it('name every cell of a workbook that could not be taken', async () => {
    await open(`/rates/${draftId}/labour`);
    server.fill.mockRejectedValue(
      new ProblemError(
        problemSchema.parse({
          ...{ type: 'urn:problem:workbook-faulty', title: 'Nothing was taken: 2 cells.', status: 400, instance: '' },
          errors: [
            { path: ['Grades', 3, 'C'], message: 'Formulas are not taken.' },
            { path: ['Recipes'], message: 'There is no sheet of this name.' },
          ],
        }),
      ),
    );
    element().querySelector<HTMLButtonElement>('button[aria-label="More"]')?.click();
    await settle();
    const fill = [...document.querySelectorAll<HTMLButtonElement>('[mat-menu-item]')];
    fill.find((item) => item.textContent?.includes('Fill from a workbook'))?.click();
    await settle();
    const chooser = element().querySelector<HTMLInputElement>('input[type="file"]')!;
    Object.defineProperty(chooser, 'files', { value: [new File(['x'], 'rates.xlsx')] });
    Object.defineProperty(chooser, 'value', { value: '', writable: true });
    chooser.dispatchEvent(new Event('change'));
    await settle();
    await settle();
    expect([...element().querySelectorAll('.refusal li')].map((line) => line.textContent?.trim())).toEqual([
      'Sheet “Grades”, cell C3 Formulas are not taken.',
      'Sheet “Recipes” There is no sheet of this name.',
    ]);
  });
});
