import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { ActivatedRoute, convertToParamMap, provideRouter } from '@angular/router';
import { of } from 'rxjs';
import { startCard } from '#shared/rate-cards/start-card';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { Role } from '#shared/actor/role';
import { EstimateServer, ids, workspaceOn } from '../../../test/estimate-server';
import { signIn, words } from '../../../test/sign-in';
import { SESSION_PORT } from '../../core/session/session-port';
import { Saving } from '../../core/saving/saving';
import { EstimateStore } from '../estimate-store';
import { PricePage } from './price-page';

describe('PricePage', () => {
  let server: EstimateServer;
  let store: EstimateStore;
  let fixture: ComponentFixture<PricePage>;
  let http: HttpTestingController;

  const element = () => fixture.nativeElement as HTMLElement;
  const settle = async (time_ms = 1) => {
    await jest.advanceTimersByTimeAsync(time_ms);
    fixture.detectChanges();
    await jest.advanceTimersByTimeAsync(1);
    fixture.detectChanges();
  };
  const spoken = (node: Element | null | undefined) => (node?.textContent ?? '').replace(/\s+/g, ' ').trim();
  const parts = () => [...element().querySelectorAll('app-part-list .name')].map((part) => spoken(part));
  const field = (label: string) =>
    [...element().querySelectorAll('app-field')]
      .find((one) => spoken(one.querySelector('label')).startsWith(label))
      ?.querySelector<HTMLInputElement & HTMLSelectElement>('input, select, textarea') as HTMLInputElement;
  const button = (text: string) =>
    [...element().querySelectorAll('button')].find((one) => spoken(one) === text) as HTMLButtonElement;
  const grid = () =>
    [...element().querySelectorAll('.content tbody tr')].map((row) =>
      [...row.querySelectorAll('td')].map((cell) => {
        const copy = cell.cloneNode(true) as HTMLElement;
        copy.querySelectorAll('.ghost').forEach((ghost) => ghost.remove());
        return spoken(copy);
      }),
    );

  const amount = (amount_minor: number) => (amount_minor / 100).toLocaleString('en-GB', { minimumFractionDigits: 2 });

  async function type(label: string, text: string): Promise<void> {
    field(label).value = text;
    field(label).dispatchEvent(new Event('input'));
    await settle();
  }

  async function choose(label: string, value: string): Promise<void> {
    field(label).value = value;
    field(label).dispatchEvent(new Event('change'));
    await settle();
  }

  /** Types into the cell of a table as one does: select it, type, Enter. */
  async function fill(row: number, column: number, text: string): Promise<void> {
    const cell = () => element().querySelectorAll('.content tbody tr')[row].querySelectorAll('td')[column];
    cell().dispatchEvent(new MouseEvent('dblclick', { bubbles: true }));
    await settle();
    const editor = cell().querySelector('input') as HTMLInputElement;
    editor.value = text;
    editor.dispatchEvent(new KeyboardEvent('keydown', { key: 'Enter', bubbles: true }));
    await settle();
  }

  async function open(part?: string, roles: readonly Role[] = ['estimator']): Promise<void> {
    TestBed.configureTestingModule({
      providers: [
        words,
        provideRouter([]),
        provideHttpClient(),
        provideHttpClientTesting(),
        { provide: SESSION_PORT, useValue: {} },
        { provide: ActivatedRoute, useValue: { queryParamMap: of(convertToParamMap({})) } },
        ...workspaceOn(server),
      ],
    });
    signIn(roles);
    http = TestBed.inject(HttpTestingController);
    store = TestBed.inject(EstimateStore);
    void store.open({ jobId: ids.job, estimateId: ids.estimate });
    await jest.advanceTimersByTimeAsync(1);
    fixture = TestBed.createComponent(PricePage);
    fixture.componentRef.setInput('part', part);
    await settle();
  }

  beforeEach(() => {
    jest.useFakeTimers();
    server = new EstimateServer();
  });
  afterEach(() => {
    jest.restoreAllMocks();
    jest.useRealTimers();
  });

  describe('shows the lines', () => {
    it('with their cost to whoever works the estimate, each price explained', async () => {
      await open();
      const headings = [...element().querySelectorAll('.content th')].map((heading) => spoken(heading));
      expect(headings).toEqual(['Line', 'Hours', 'Direct', 'Overhead', 'Contingency', 'Cost', 'Price, €']);
      expect(grid()[0][0]).toBe('Top edge');
      element().querySelector<HTMLElement>('.content td app-figure button')?.click();
      await settle();
      expect(spoken(element().querySelector('app-reason-panel'))).toContain('with a margin of 18% of the price');
    });

    it('without a word of cost to the office, who cannot change them', async () => {
      const whole = await server.read();
      const { cost: _cost, ...figures } = whole.figures;
      const { profit: _profit, contingency: _risk, extras: _extras, seed: _seed, ...settings } = whole.settings;
      server.read = () => Promise.resolve({ ...whole, figures, settings } as unknown as typeof whole);
      await open(undefined, ['office']);
      expect(parts()).toEqual(['Lines', 'Stages of payment', 'Alternatives']);
      expect(element().querySelectorAll('.content th')).toHaveLength(2);
      expect(element().querySelector('app-money-bar')).toBeNull();
      expect(element().querySelector<HTMLFieldSetElement>('app-presentation-choice fieldset')?.disabled).toBe(true);
    });

    it('by kind of work where that is chosen, which the paper follows', async () => {
      await open();
      const first = grid()[0][0];
      element()
        .querySelectorAll<HTMLInputElement>('app-presentation-choice input')[1]
        .dispatchEvent(new Event('change'));
      await settle(700);
      expect(server.settings.presentation).toBe('kinds');
      expect(grid()[0][0]).not.toBe(first);
    });

    it('with where the money goes in words and figures that are the net price together', async () => {
      await open();
      const rows = [...element().querySelectorAll('app-money-bar tbody tr:not(.about)')];
      const amounts = rows.map((row) =>
        Math.round(Number(spoken(row.querySelector('td')).replace(/[^\d.-]/g, '')) * 100),
      );
      expect(amounts.reduce((sum, amount) => sum + amount, 0)).toBe(store.priced()?.price.net_minor);
      expect(element().querySelectorAll('app-money-bar rect')).toHaveLength(rows.length);
    });
  });

  it('explains itself anew as soon as its figures move', async () => {
    const match = matchMedia;
    const wide = (media: string) => ({ ...match(media), matches: media.includes('min-width') });
    jest.spyOn(globalThis, 'matchMedia').mockImplementation(wide);
    await open();
    const heading = () => spoken(element().querySelector('app-reason-panel h4'));
    const before = heading();
    store.changeMember(ids.leg, { ...memberContent(ids.edge), count: 3 });
    await settle();
    expect(before).toMatch(/profit, because$/);
    expect(heading()).not.toBe(before);
  });

  describe('takes profit', () => {
    it('from the card until it is said otherwise, beginning with what the card has', async () => {
      await open('profit');
      expect(spoken(element().querySelector('app-profit-form option'))).toContain('margin of 18%');
      await choose('Profit is', 'margin');
      expect(field('Margin').value).toBe('18');
      await type('Margin', '25');
      await settle(700);
      expect(server.settings.profit).toEqual({ way: 'margin', percent: '25' });
      expect(spoken(element().querySelector('app-profit-figures'))).toContain('25.0033.33');
    });

    it('said the other way, the price staying where it was to the next cents', async () => {
      server.settings = { ...server.settings, profit: { way: 'margin', percent: '20' } };
      await open('profit');
      const before_minor = store.priced()!.price.net_minor;
      await choose('Profit is', 'mark-up');
      expect([field('Mark-up').value, store.priced()!.price.net_minor]).toEqual(['25', before_minor]);
    });

    it('from a lump sum, beginning with what the lines come to, and shows the margin that is left', async () => {
      await open('profit');
      const before_minor = store.priced()!.price.subtotal_minor;
      await choose('Profit is', 'lump-sum');
      expect(store.priced()!.price.subtotal_minor).toBe(before_minor);
      await type('Lump sum', '1000');
      await settle(700);
      expect(server.settings.profit).toEqual({ way: 'lump-sum', amount: '1000' });
      expect(store.priced()!.price.net_minor).toBe(100_000);
      const [asked, left] = [...element().querySelectorAll('app-profit-figures tbody tr')].map((row) => spoken(row));
      expect(asked).toBe('asked––');
      expect(left).toMatch(/^left[−\d]/);
    });

    it('and leaves no margin where a discount takes more than the price', async () => {
      await open('profit');
      await choose('Discount', 'amount');
      await type('Amount taken off', '999999');
      expect(spoken(element().querySelector('app-profit-figures .strong td'))).toBe('–');
    });

    it('and says why the trials have another direct cost where the price itself is insured', async () => {
      await open('extras');
      button('Insurance in care').click();
      await settle();
      fixture.componentRef.setInput('part', 'profit');
      await settle(900);
      const { direct_minor } = store.costed()!.cost.price;
      const atLikely_minor = store.costed()!.cost.risk!.direct_minor.atLikely;
      expect(direct_minor).toBeGreaterThan(atLikely_minor);
      const difference = ((direct_minor - atLikely_minor) / 100).toFixed(2);
      expect(spoken(element().querySelector('app-risk-table'))).toContain(`differs by €${difference} of insurance`);
    });

    it('and warns where a discount takes the price below its cost', async () => {
      await open('profit');
      await choose('Discount', 'percent');
      await type('Share taken off', '40');
      expect(spoken(element().querySelector('app-finding-list'))).toContain('below cost');
      await type('Share taken off', '1');
      expect(element().querySelector('app-finding-list')).toBeNull();
    });

    it('sends nothing that cannot be read, keeps it while one looks elsewhere, and comes back to it', async () => {
      await open('profit');
      await choose('Profit is', 'margin');
      await settle(700);
      await type('Margin', '1O');
      await settle(700);
      expect(server.settings.profit).toEqual({ way: 'margin', percent: '18' });
      expect(TestBed.inject(Saving).hasUnsent()).toBe(true);
      fixture.componentRef.setInput('part', 'stages');
      await settle();
      fixture.componentRef.setInput('part', 'profit');
      await settle();
      expect(element().querySelector('app-profit-form [aria-invalid="true"]')).not.toBeNull();
      await type('Margin', '20');
      await settle(700);
      expect(server.settings.profit).toMatchObject({ percent: '20' });
    });

    it('and shows again what an undo brings back', async () => {
      await open('profit');
      await choose('Discount', 'amount');
      await type('Amount taken off', '50');
      await settle(2500);
      await type('Amount taken off', '75');
      store.undo();
      await settle();
      expect(field('Amount taken off').value).toBe('50');
    });

    it('marks the price as being worked out while risk is drawn for it', async () => {
      await open('profit');
      await choose('Contingency is', 'risk');
      store.changeMember(ids.leg, { ...memberContent(ids.leg), count: 4 });
      await settle();
      expect(spoken(element().querySelector('app-risk-table [role="status"]'))).toContain('Being worked out');
      await settle(900);
      expect(spoken(element().querySelector('app-risk-table'))).toContain('seed 7');
    });
  });

  describe('takes further lines', () => {
    it('from the card with one press, at its figures, and takes them back', async () => {
      await open('extras');
      button('Packing and crate').click();
      await settle();
      expect(grid().map(([name, , quantity, unit, rate]) => [name, quantity, unit, rate])).toEqual([
        ['Packing', '6', 'h', ''],
        ['Crate', '', '', '180.00'],
      ]);
      store.undo();
      await settle();
      expect(store.settings()?.extras).toEqual([]);
    });

    it('typed in the table; what cannot be read stays with its remark and is not sent', async () => {
      await open('extras');
      button('Timber').click();
      await settle();
      await fill(0, 2, '25');
      await fill(0, 4, '1,200');
      expect(store.settings()?.extras?.[0]).toMatchObject({ volume_dm3: 25, price_per_dm3: '2.40' });
      expect(grid()[0][4]).toContain('1,200');
      expect(grid()[0][4]).toContain('thousands');
      await fill(0, 4, '3.10');
      await settle(700);
      expect(server.settings.extras[0]).toMatchObject({ price_per_dm3: '3.1' });
    });

    it('by a measuring rule, the quantity reckoned, explained and kept with the line', async () => {
      await open('extras');
      button('Measured work').click();
      await settle();
      await choose('Measured by', 'narrow-girth');
      await type('Length measured', '3048 mm');
      await type('Girth measured', '4 in');
      await settle(700);
      // An Old Hand, Hints for Painters: 4 in counts as 6; 3.048 × 0.1524 m.
      expect(server.settings.extras[0]).toMatchObject({
        ...{ rule: 'narrow members at a girth of 6 or 12 inches', quantity: '0.4645', unit: 'm²' },
        measured: {
          ...{ rule: 'narrow-girth', measures: [{ count: 1, length_mm: 3048, girth_mm: 101.6 }] },
          typed: { 'measures.0.length_mm': '3048 mm', 'measures.0.girth_mm': '4 in' },
        },
      });
      element().querySelector<HTMLElement>('app-measured-quantity app-figure button')?.click();
      await settle();
      expect(spoken(element().querySelector('app-reason-panel'))).toContain('paid as');
      await choose('Measured by', 'own');
      await type('Quantity', '7');
      await settle(700);
      expect(server.settings.extras[0]).toMatchObject({ quantity: '7' });
      expect(server.settings.extras[0]).not.toHaveProperty('measured');
    });

    it('from several measures added under one rule, so many alike as so many', async () => {
      await open('extras');
      button('Measured work').click();
      await settle();
      await choose('Measured by', 'plain-area');
      await type('How many', '3');
      await type('Length measured', '8 ft 2 in');
      await type('Girth measured', '3 in');
      await settle(700);
      button('Another measure').click();
      await settle(700);
      // The second is not whole yet: what was reckoned stays, and nothing is shown for the whole.
      expect(server.settings.extras[0]).toMatchObject({ quantity: '0.569' });
      expect(spoken(element().querySelector('app-measured-quantity'))).toContain(
        'until it is, the quantity kept before stands',
      );
      const second = [...element().querySelectorAll<HTMLInputElement>('app-measured-quantity tr[data-row="1"] input')];
      expect(second.map(({ value }) => value)).toEqual(['1', '', '76.2']);
      for (const [place, text] of [
        [0, '2'],
        [1, '1 ft 9 in'],
      ] as const) {
        second[place].value = text;
        second[place].dispatchEvent(new Event('input'));
      }
      await settle(700);
      // Own: 3 × 98 in and 2 × 21 in by 3 in are 1,008 in².
      expect(server.settings.extras[0]).toMatchObject({
        quantity: '0.6503',
        measured: {
          measures: [
            { count: 3, length_mm: 2489.2 },
            { count: 2, length_mm: 533.4, girth_mm: 76.2 },
          ],
        },
      });
    });

    it('and a figure typed over a reckoned quantity stands by itself', async () => {
      await open('extras');
      button('Measured work').click();
      await settle();
      await choose('Measured by', 'carved-each-side');
      await type('Area measured flat', '0.5 m²');
      await settle(700);
      expect(server.settings.extras[0]).toMatchObject({ quantity: '1' });
      await fill(0, 2, '9');
      await settle(700);
      expect(server.settings.extras[0]).toMatchObject({ quantity: '9' });
      expect(server.settings.extras[0]).not.toHaveProperty('measured');
    });

    it('entered in full in the form of the chosen line', async () => {
      await open('extras');
      button('Measured work').click();
      await settle();
      await type('Measuring rule', 'Girth, narrow members at 150 mm');
      await choose('Belongs to', [...(field('Belongs to') as unknown as HTMLSelectElement).options][1].value);
      await settle(700);
      expect(server.settings.extras[0]).toMatchObject({
        rule: 'Girth, narrow members at 150 mm',
        memberId: ids.edge,
      });
    });
  });

  async function paste(row: number, column: number, text: string): Promise<void> {
    element().querySelectorAll('.content tbody tr')[row].querySelectorAll('td')[column].click();
    await settle();
    const event = new Event('paste', { bubbles: true, cancelable: true });
    Object.assign(event, { clipboardData: { getData: () => text } });
    element().querySelector('.content table')!.dispatchEvent(event);
    await settle();
  }

  it('takes lines of a spreadsheet, and makes further lines of those beyond the last', async () => {
    await open('extras');
    button('Timber').click();
    await settle();
    await paste(0, 0, 'Lime\t\t12\nOak\t\t30\nPine\t\t8');
    expect(grid().map(([name, , quantity]) => [name, quantity])).toEqual([
      ['Lime', '12'],
      ['Oak', '30'],
      ['Pine', '8'],
    ]);
    await settle(700);
    expect(new Set(server.settings.extras.map(({ id }) => id)).size).toBe(3);
  });

  it('warns of a further line that comes to nothing', async () => {
    await open('extras');
    button('Timber').click();
    await settle();
    const told = () => spoken(element().querySelector('app-extras-part app-finding-list'));
    await fill(0, 2, '0');
    expect(told()).toContain('comes to nothing');
    await fill(0, 2, '12');
    expect(told()).toBe('');
  });

  describe('takes stages', () => {
    it('of a spreadsheet, as many as there are', async () => {
      await open('stages');
      await paste(1, 0, 'Begun\t10\nCarved\t40\nGilt\t30\nSet up\t20');
      await settle(700);
      expect(server.settings.stages.parts.map(({ name, percent }) => [name, percent])).toEqual([
        ['Begun', 10],
        ['Carved', 40],
        ['Gilt', 30],
        ['Set up', 20],
      ]);
    });

    it('never of what a variation takes away: it is credited whole', async () => {
      await open('stages');
      expect(element().querySelector('app-taken-away-note')).toBeNull();
      const line = { id: ids.piece, name: 'Left out', taxCategoryId: 'standard', memberId: null, alternativeId: null };
      store.changeSettings({ extras: [{ ...line, kind: 'price', price: '-900000' }] });
      await settle(700);
      expect(store.priced()!.price.gross_minor).toBeLessThan(0);
      expect(spoken(element().querySelector('app-taken-away-note'))).toMatch(/^€[\d,.]+ is taken off what was agreed/);
      expect(element().querySelector('app-stages-part app-figure-table')).toBeNull();
    });

    it('that come to 100 %, waiting with those that do not, and shows every payment to the cent', async () => {
      await open('stages');
      const before = server.settings.stages.parts;
      await fill(1, 1, '30');
      await settle(700);
      expect(spoken(element().querySelector('.missing'))).toContain('10% is missing');
      expect(server.settings.stages.parts).toEqual(before);
      button('Add a stage').click();
      await settle(700);
      expect(server.settings.stages.parts.map(({ percent }) => percent)).toEqual([30, 40, 20, 10]);
      const paid = grid().map((row) => Number(row.at(-1)?.replace(/,/g, '')));
      const gross_minor = store.priced()!.price.gross_minor;
      expect(Math.round(paid.reduce((sum, amount) => sum + amount, 0) * 100)).toBe(gross_minor);
    });

    it('and refuses a deposit and a retention that are more than the contract together', async () => {
      await open('stages');
      await type('Deposit', '97');
      field('Retention').dispatchEvent(new Event('blur'));
      await settle(700);
      expect(spoken(element().querySelector('app-stage-terms-form [role="alert"]'))).toContain('Deposit and retention');
      expect(server.settings.stages.deposit_percent).toBe(30);
    });
  });

  it('shows the office what each alternative comes to, without a word of cost', async () => {
    const whole = await server.read();
    const { cost: _cost, ...figures } = whole.figures;
    const { profit: _profit, contingency: _risk, extras: _extras, seed: _seed, ...settings } = whole.settings;
    const plain = { id: ids.leg, name: 'Bare back', group: '', note: '', replaces: [] };
    server.read = () =>
      Promise.resolve({
        ...whole,
        figures,
        settings: { ...settings, alternatives: [plain] },
      } as unknown as typeof whole);
    const { booklets, carving_hours, handsOn_hours, workingDays, weeks } = figures.tally;
    const tally = { booklets: booklets + 2, hours: carving_hours.likely + handsOn_hours.likely, workingDays, weeks };
    const gross_minor = figures.price.gross_minor - 2_000;
    server.totals = [{ id: ids.leg, gross_minor, difference_minor: -2_000, tally }];
    await open('alternatives', ['office']);
    await settle();
    const [base, bare] = grid();
    expect([base[0], Number(base[1]), base[5]]).toEqual(['The base', booklets, amount(figures.price.gross_minor)]);
    expect([bare[0], bare[1]]).toEqual(['Bare back', `${booklets + 2}+2`]);
    expect(bare.slice(2, 5).every((cell) => cell.endsWith('as the base'))).toBe(true);
    expect(bare[5]).toBe(`${amount(gross_minor)}−20.00`);
    expect(element().querySelector('.content button')).toBeNull();
  });

  describe('takes alternatives', () => {
    const sections = () =>
      [...element().querySelectorAll('app-alternative-sections section')].map((side) => [
        spoken(side.querySelector('h4')),
        side.querySelectorAll('svg').length,
      ]);
    const zoneOf = (id: string) => store.members().find((member) => member.id === id)!.zones;

    async function begin(): Promise<void> {
      await open('alternatives');
      button('Add an alternative').click();
      await settle();
    }

    it('with another way of a zone beside the first, as one step, at a price of its own', async () => {
      await begin();
      [...element().querySelectorAll<HTMLButtonElement>('.base button')][1].click();
      await settle();
      const [base, copy] = zoneOf(ids.edge);
      expect(copy).toMatchObject({ name: base.name, alternativeId: store.settings()!.alternatives[0].id });
      expect(store.settings()!.alternatives[0].replaces).toEqual([base.id]);
      const bare = store.members().find(({ id }) => id === ids.edge)!;
      const { id: _id, ...content } = bare;
      store.changeMember(ids.edge, { ...content, zones: [base, { ...copy, buildUpId: 'bare', leafId: null }] });
      await settle(1500);
      const [first, other] = grid();
      const minor = (cell: string) => Math.round(Number(cell.replace(/,/g, '').replace('−', '-')) * 100);
      expect(minor(first[5])).toBe(store.priced()!.price.gross_minor);
      const [gross, difference] = other[5].split(/(?=−)/);
      expect(minor(gross)).toBeLessThan(minor(first[5]));
      expect(minor(difference)).toBe(minor(gross) - minor(first[5]));
      // No leaf on bare wood: what the base has of it, the other is less.
      expect(other[1]).toBe(`0−${first[1]}`);
      for (const cell of other.slice(2, 5)) expect(cell).toMatch(/^[\d.]+−[\d.]+$/);
      expect(sections()).toEqual([
        ['In the base', 1],
        ['With “Another way”', 0],
      ]);
    });

    it('with the sections of its build-ups beside those of the base', async () => {
      await begin();
      [...element().querySelectorAll<HTMLButtonElement>('.base button')][1].click();
      await settle(1500);
      expect(sections()).toEqual([
        ['In the base', 1],
        ['With “Another way”', 1],
      ]);
      const [base, own] = [...element().querySelectorAll('app-alternative-sections svg')];
      expect(own.getAttribute('aria-label')).toBe(base.getAttribute('aria-label'));
    });

    it('and says so where two of them take the place of the same zone', async () => {
      await begin();
      const { alternatives } = store.settings()!;
      const two = ['Oil', 'Silver'].map((name, place) => ({
        ...alternatives[0],
        ...{ id: [ids.leg, ids.piece][place], name, replaces: [zoneOf(ids.edge)[0].id] },
      }));
      store.changeSettings({ alternatives: two });
      await settle(1500);
      expect(spoken(element().querySelector('app-alternatives-part app-finding-list'))).toContain(
        '“Oil” and “Silver” may be chosen together, and both take the place of “Top edge, All of it”',
      );
    });

    it('and removes one with all that stands in it alone', async () => {
      await begin();
      [...element().querySelectorAll<HTMLButtonElement>('.base button')][0].click();
      await settle();
      expect(store.members()).toHaveLength(3);
      button('Remove the alternative').click();
      await settle();
      expect([store.members().length, store.settings()!.alternatives.length]).toEqual([2, 0]);
      store.undo();
      await settle();
      expect([store.members().length, store.settings()!.alternatives.length]).toEqual([3, 1]);
    });

    it('and shows every figure with one, until the base is taken again', async () => {
      await begin();
      button('Show all figures with it').click();
      await settle();
      expect(spoken(element().querySelector('.shown'))).toContain('Another way');
      button('Show the base again').click();
      await settle();
      expect(store.choice()).toEqual([]);
    });
  });

  describe('works on a rate card', () => {
    const spring = {
      ...{ id: ids.card, version: 1, name: 'Spring', state: 'in-force', from: '2026-03-01' },
      ...{ basedOnId: null, changedAt: '2026-03-01T08:00:00.000Z' },
    };
    const autumn = { ...spring, id: ids.piece, name: 'Autumn', from: '2026-09-01' };
    const dearer: RateCard = {
      ...startCard,
      money: { ...startCard.money, grades: startCard.money.grades.map((grade) => ({ ...grade, costPerHour: '60' })) },
    };
    const list = async (items: readonly object[]) => {
      const asked = http.expectOne(({ url }) => url.startsWith('/api/rate-cards?') || url === '/api/rate-cards');
      asked.flush({ items, next: null, count: items.length, countIsExact: true });
      await settle();
    };

    it('names it, and leaves it where it is in force', async () => {
      await open('card');
      await list([spring]);
      expect(spoken(element().querySelector('app-card-part'))).toContain('Spring”, in force from 1 Mar 2026');
      expect(spoken(element().querySelector('app-card-part'))).toContain('It is the card in force.');
    });

    it('shows what a newer one in force would change, line by line, before it is taken', async () => {
      await open('card');
      await list([autumn, { ...spring, state: 'past' }]);
      button('See what it changes').click();
      await settle();
      http.expectOne(`/api/rate-cards/${ids.piece}`).flush({ ...autumn, content: dearer });
      await settle();
      const part = spoken(element().querySelector('app-card-part'));
      expect(part).toContain('5 lines of the card differ');
      expect(part).toContain('Top edge, Ground');
      const taken = jest.spyOn(store, 'takeCard').mockResolvedValue();
      button('Take the card in force').click();
      await settle();
      expect(taken.mock.calls).toEqual([[ids.piece]]);
    });
  });

  function memberContent(id: string) {
    const { id: _id, ...content } = store.members().find((member) => member.id === id)!;
    return content;
  }
});
