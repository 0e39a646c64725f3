import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { ActivatedRoute, convertToParamMap, provideRouter, Router } from '@angular/router';
import { of } from 'rxjs';
import type { Type } from '@angular/core';
import type { Role } from '#shared/actor/role';
import type { FrozenDates as Dates, PricedIssueSummary } from '#shared/estimates/issue-schema';
import { EstimateServer, ids, refusal, workspaceOn } from '../../../test/estimate-server';
import { signIn, words } from '../../../test/sign-in';
import { Confirm } from '../../ui/dialog/confirm';
import { NOW } from '../../core/now';
import { EstimateStore } from '../estimate-store';
import type { PresenceAnswer } from '../presence';
import { IssueClient, type IssueMark, type ReadIssue } from './issue-client';
import { IssuePage } from './issue-page';
import { IssueViewPage } from './issue-view-page';
import { SheetsPage } from './sheets-page';

const issueA: PricedIssueSummary = {
  id: '018f0000-0000-7000-8000-000000000201',
  estimateId: ids.estimate,
  letter: 'A',
  state: 'issued',
  issuedAt: '2026-03-02T09:30:00.000Z',
  issuedBy: 'Imke Vale',
  note: 'As measured on site.',
  validUntil: '2026-05-01',
  leafValidUntil: '2026-04-01',
  markedOn: null,
  markNote: '',
  sha256: 'a'.repeat(64),
  net_minor: 50_000,
  tax_minor: 10_000,
  gross_minor: 60_000,
};

const difference = {
  ...{ lineId: 'x/carving', member: 'Top edge', kind: 'carving', name: null },
  before_minor: 1000,
  after_minor: 1250,
};

describe('The pages of issues', () => {
  let server: EstimateServer;
  let fixture: ComponentFixture<unknown>;
  let marks: IssueMark[];
  let issued: number;
  let isConfirmed: boolean;
  let read: Partial<ReadIssue>;

  const element = () => fixture.nativeElement as HTMLElement;
  const settle = async (time_ms = 1) => {
    for (let round = 0; round < 3; round++) {
      await jest.advanceTimersByTimeAsync(round === 0 ? time_ms : 1);
      fixture.detectChanges();
    }
  };
  const spoken = (node: Element | null | undefined) => (node?.textContent ?? '').replace(/\s+/g, ' ').trim();
  const button = (text: string) =>
    [...element().querySelectorAll('button')].find((one) => spoken(one) === text) as HTMLButtonElement;
  const links = () =>
    [...element().querySelectorAll<HTMLAnchorElement>('a[download]')].map((link) => [
      spoken(link),
      link.getAttribute('href'),
    ]);

  async function open(page: Type<unknown>, inputs: Record<string, unknown> = {}, roles: readonly Role[] = ['owner']) {
    const estimate = await server.read();
    const client = {
      workshop: () =>
        Promise.resolve({ name: 'Mill Yard Carvers', addressLines: ['2 Mill Yard'], telephone: '', email: '' }),
      client: () => Promise.resolve({ name: 'Vesper House', address: '1 The Row' }),
      differences: () => Promise.resolve({ letter: 'A', lines: [difference] }),
      read: () =>
        Promise.resolve({
          ...{ summary: issueA, differences: [], alternatives: [], dates: null, estimate },
          ...read,
        }),
      mark: (_id: string, mark: IssueMark) => {
        marks.push(mark);
        return Promise.resolve({ ...issueA, state: mark.state, markedOn: mark.day, markNote: mark.note });
      },
      issue: () => {
        issued += 1;
        return issued === 1 ? Promise.reject(refusal(503)) : Promise.resolve(issueA);
      },
      logoAddress: () => '/logo',
      paperAddress: (id: string, paper: string) => `/papers/${id}/${paper}`,
      benchSheetAddress: (_estimate: string, piece: string) => `/sheets/${piece}`,
    };
    TestBed.configureTestingModule({
      providers: [
        words,
        provideRouter([]),
        { provide: ActivatedRoute, useValue: { queryParamMap: of(convertToParamMap({})) } },
        ...workspaceOn(server),
        { provide: IssueClient, useValue: client },
        { provide: Confirm, useValue: { ask: () => Promise.resolve(isConfirmed) } },
        { provide: NOW, useValue: () => new Date('2026-03-03T12:00:00Z') },
      ],
    });
    signIn(roles);
    void TestBed.inject(EstimateStore).open({ jobId: ids.job, estimateId: ids.estimate });
    await jest.advanceTimersByTimeAsync(1);
    fixture = TestBed.createComponent(page);
    Object.entries(inputs).forEach(([name, value]) => fixture.componentRef.setInput(name, value));
    await settle();
  }

  beforeEach(() => {
    jest.useFakeTimers();
    server = new EstimateServer();
    server.issues = () => Promise.resolve([issueA]);
    server.job = () =>
      Promise.resolve({ title: 'Pier table', clientId: ids.piece } as unknown as Awaited<
        ReturnType<typeof server.job>
      >);
    marks = [];
    issued = 0;
    isConfirmed = true;
    read = {};
  });
  afterEach(() => jest.useRealTimers());

  describe('IssuePage', () => {
    it('lists the draft and the issues with letter, state, day and gross price', async () => {
      await open(IssuePage);
      const rows = [...element().querySelectorAll('app-part-list a')].map((row) => spoken(row));
      expect(rows[0]).toContain('Issue B');
      expect(rows[1]).toBe('Issue Aissued, 2 Mar 2026€600');
    });

    it('tells what is new line by line, and what it comes to', async () => {
      await open(IssuePage);
      expect(spoken(element().querySelector('summary'))).toContain('One line differs from issue A, together by +€2.50');
      expect(spoken(element().querySelector('app-difference-table'))).toContain('Top edge, Carving 10.0012.50+2.50');
    });

    it('shows the paper as the client will have it: letterhead, address, lines without cost, until when prices hold', async () => {
      await open(IssuePage);
      const paper = spoken(element().querySelector('app-paper-preview'));
      for (const said of ['Mill Yard Carvers', 'Vesper House', 'Estimate 12-1, issue B, 3 Mar 2026', 'Top edge'])
        expect(paper).toContain(said);
      expect(paper).toContain('Prices hold until 2 May 2026, those of leaf until 2 Apr 2026.');
      expect(paper).not.toContain('Overhead');
    });

    it('keeps what is typed for the paper', async () => {
      await open(IssuePage);
      const introduction = element().querySelectorAll('textarea')[0];
      introduction.value = 'A base for the long gallery.';
      introduction.dispatchEvent(new Event('input'));
      await settle(700);
      expect(server.settings.introduction).toBe('A base for the long gallery.');
      expect(spoken(element().querySelector('app-paper-preview'))).toContain('A base for the long gallery.');
    });

    it('lists what stops it in words, leads there, and lets nobody press', async () => {
      const [edge] = server.members;
      const zones = edge.content.zones.map((one) => ({ ...one, leafId: null }));
      server.members = [{ ...edge, content: { ...edge.content, zones } }, ...server.members.slice(1)];
      await open(IssuePage);
      const navigate = jest.spyOn(TestBed.inject(Router), 'navigate').mockResolvedValue(true);
      const stop = element().querySelector<HTMLButtonElement>('.checks app-finding-list button');
      expect(spoken(stop)).toContain('Choose the leaf');
      expect(button('Issue B').disabled).toBe(true);
      stop?.click();
      expect(navigate.mock.calls[0]).toEqual([
        ['/jobs', ids.job, 'estimates', ids.estimate, 'gild'],
        { queryParams: { member: ids.edge } },
      ]);
    });

    it('warns of letters the papers cannot print, names text and letters, leads there, and still lets one issue', async () => {
      const [edge, leg] = server.members;
      server.members = [edge, { ...leg, content: { ...leg.content, name: 'Leg 腿' } }];
      server.settings = { ...server.settings, terms: 'תוך שבוע' };
      await open(IssuePage);
      const navigate = jest.spyOn(TestBed.inject(Router), 'navigate').mockResolvedValue(true);
      const told = () =>
        [...element().querySelectorAll('.checks app-finding-list > ul > .warn')]
          .map((line) => spoken(line))
          .filter((line) => line.includes('empty boxes'));
      expect(told()).toEqual([
        expect.stringContaining('The terms would print with empty boxes in place of ת ו ך ש ב ע.'),
        expect.stringContaining('The member “Leg 腿” would print with empty boxes in place of 腿.'),
      ]);
      const note = element().querySelector<HTMLTextAreaElement>('app-issue-box textarea');
      if (note) note.value = '如测量';
      note?.dispatchEvent(new Event('input'));
      await settle();
      expect(told().at(-1)).toContain('The note would print with empty boxes in place of 如 测 量.');
      expect(button('Issue B').disabled).toBe(false);
      [...element().querySelectorAll<HTMLButtonElement>('.checks .warn button')]
        .find((one) => spoken(one).includes('腿'))
        ?.click();
      expect(navigate.mock.calls[0]).toEqual([
        ['/jobs', ids.job, 'estimates', ids.estimate, 'measure'],
        { queryParams: { member: ids.leg } },
      ]);
    });

    it('previews the sums and the scope as the paper will have them', async () => {
      await open(IssuePage);
      const preview = () => spoken(element().querySelector('app-paper-preview'));
      expect(preview()).toMatch(/Net.+Standard rate, 20%.+Total/);
      expect(preview()).toContain('Measured only, with no work on it in this price: Leg.');
    });

    it('previews one sum where all lies outside the scope of tax', async () => {
      server.settings = { ...server.settings, taxCategoryId: 'outside-scope' };
      await open(IssuePage);
      const sums = [...element().querySelectorAll('app-paper-preview app-price-sums dt')].map(spoken);
      expect(sums).toEqual(['Total']);
      expect(spoken(element().querySelector('app-paper-preview .untaxed'))).toBe('Not subject to tax');
      expect(spoken(element().querySelector('app-issue-box'))).toContain(
        'Nothing here is taxed as the workshop usually is',
      );
    });

    it('hears at once of a card that has just come into force, before it says that nothing stops it', async () => {
      let answer: (present: PresenceAnswer) => void = () => undefined;
      const asked = () => new Promise<PresenceAnswer>((resolve) => (answer = resolve));
      (server as { presence: () => Promise<PresenceAnswer> }).presence = asked;
      await open(IssuePage);
      expect(spoken(element().querySelector('app-issue-box'))).not.toContain('Nothing stops it');
      answer({ version: 1, others: [], rateCardInForceId: ids.leg });
      await settle();
      const box = spoken(element().querySelector('app-issue-box'));
      expect(box).toContain('The old card is meant');
      expect(box).not.toContain('Nothing stops it');
    });

    it('says that nothing stops it once it was heard that nothing does', async () => {
      const present: PresenceAnswer = { version: 1, others: [], rateCardInForceId: ids.card };
      (server as { presence: () => Promise<PresenceAnswer> }).presence = () => Promise.resolve(present);
      await open(IssuePage);
      expect(spoken(element().querySelector('app-issue-box'))).toContain('Nothing stops it');
    });

    it.each([
      [ids.leg, false],
      [null, true],
    ])('tells of rates nobody has gone through: worked on a card copied from %s, %s', async (basedOnId, isTold) => {
      server.basedOnId = basedOnId;
      await open(IssuePage);
      const box = spoken(element().querySelector('app-issue-box'));
      expect(box.includes('those every workshop is founded with')).toBe(isTold);
    });

    it('is issued by one button; where it did not arrive it says so and may be pressed again', async () => {
      await open(IssuePage);
      const go = jest.spyOn(TestBed.inject(Router), 'navigateByUrl').mockResolvedValue(true);
      button('Issue B').click();
      button('Issue B').click();
      await settle();
      expect(spoken(element().querySelector('app-form-complaint'))).toBe('refused 503');
      button('Issue B').click();
      await settle();
      expect([issued, String(go.mock.calls[0][0])]).toEqual([
        2,
        `/jobs/${ids.job}/estimates/${ids.estimate}/issue/${issueA.id}`,
      ]);
    });

    it('lets the office read and change nothing', async () => {
      await open(IssuePage, {}, ['office']);
      expect(element().querySelectorAll('app-issue-box, app-issue-texts-form, app-presentation-choice')).toHaveLength(
        0,
      );
      expect(element().querySelector('app-paper-preview article')).not.toBeNull();
    });
  });

  describe('IssueViewPage', () => {
    const view = { issueId: issueA.id };

    it('shows the issue as it was frozen, whatever the draft has become', async () => {
      await open(IssueViewPage, view);
      const net = server.figures().price.net_minor;
      TestBed.inject(EstimateStore).changeSettings({ profit: { way: 'margin', percent: '60' } });
      await settle();
      expect(TestBed.inject(EstimateStore).priced()?.price.net_minor).not.toBe(net);
      const page = spoken(element());
      expect(page).toContain('made on 2 Mar 2026, 09:30 by Imke Vale');
      expect(page).toContain('As measured on site.');
      const shown = spoken(element().querySelector('app-price-sums')).replace(/[^\d]/g, ' ');
      expect(shown).toContain(String(net).slice(-2));
      expect(spoken(element().querySelector('app-price-sums'))).toContain((net / 100).toFixed(2).slice(-6));
    });

    it('offers its papers; the workbook, which shows cost, not to the office', async () => {
      await open(IssueViewPage, view);
      expect(links()).toEqual([
        ['Estimate, PDF', `/papers/${issueA.id}/estimate.pdf`],
        ['Estimate, workbook', `/papers/${issueA.id}/estimate.xlsx`],
        ['Leaf order, PDF', `/papers/${issueA.id}/leaf-order.pdf`],
        ['Leaf order, CSV', `/papers/${issueA.id}/leaf-order.csv`],
      ]);
      TestBed.resetTestingModule();
      await open(IssueViewPage, view, ['office']);
      expect(links().map(([name]) => name)).not.toContain('Estimate, workbook');
    });

    it('lets the office mark it as sent today, and then asks what came of it', async () => {
      await open(IssueViewPage, view, ['office']);
      element().querySelector('app-mark-form form')?.dispatchEvent(new Event('submit'));
      await settle();
      expect(marks).toEqual([{ state: 'sent', day: '2026-03-03', note: '' }]);
      expect(spoken(element().querySelector('app-issue-facts .chip'))).toBe('sent on 3 Mar 2026');
      const offered = [...element().querySelectorAll('app-mark-form option')].map((option) => spoken(option));
      expect(offered).toEqual(['accepted', 'declined']);
    });

    it('marks it as accepted only once that is confirmed, since it stands for good', async () => {
      read = { summary: { ...issueA, state: 'sent' } };
      isConfirmed = false;
      await open(IssueViewPage, view);
      element().querySelector('app-mark-form form')?.dispatchEvent(new Event('submit'));
      await settle();
      expect(marks).toEqual([]);
      isConfirmed = true;
      element().querySelector('app-mark-form form')?.dispatchEvent(new Event('submit'));
      await settle();
      expect(marks.map(({ state }) => state)).toEqual(['accepted']);
      expect(element().querySelector('app-mark-form')).toBeNull();
    });

    it('shows the dates it was made with and what they assume, to the office as well', async () => {
      const assumptions: Dates['assumptions'] = [
        { kind: 'note', code: 'programme-assumes-in-hand', values: { days: 3 } },
        { kind: 'note', code: 'programme-assumes-promised', values: { jobs: 2 } },
      ];
      const days = { startsOn: '2026-03-09', finishesOn: '2026-04-17', offeredOn: '2026-04-24', workingDays: 30 };
      read = { dates: { ...days, assumptions } };
      await open(IssueViewPage, view, ['office']);
      const dates = spoken(element().querySelector('app-frozen-dates'));
      for (const part of ['9 Mar 2026', '17 Apr 2026', '24 Apr 2026', 'open on 30 days of that time'])
        expect(dates).toContain(part);
      expect(element().querySelectorAll('app-frozen-dates li')).toHaveLength(2);
    });

    it('of a variation that takes away shows how it is settled, and no payments', async () => {
      read = { summary: { ...issueA, gross_minor: -1_800_00 } };
      await open(IssueViewPage, view);
      const payments = element().querySelector('app-frozen-payments');
      expect(spoken(payments)).toContain('€1,800.00 is taken off what was agreed');
      expect(payments?.querySelector('table')).toBeNull();
    });

    describe('with alternatives', () => {
      const alternative = { id: ids.leg, name: 'Bare at the back', group: '', note: '', replaces: [] };
      const total = { id: ids.leg, gross_minor: 55_000, difference_minor: -5000 };
      const cells = () =>
        [...element().querySelectorAll('app-frozen-alternatives tbody tr')].map((row) =>
          [...row.querySelectorAll('td')].map(spoken),
        );
      const sides = () =>
        [...element().querySelectorAll('app-alternative-sections section')].map((side) => [
          spoken(side.querySelector('h4')),
          side.querySelectorAll('svg').length,
        ]);

      beforeEach(() => {
        server.settings = { ...server.settings, alternatives: [alternative] };
      });

      it('shows each beside the base with its leaf, hours, days and price, and the sections it changes', async () => {
        const { tally, price } = (await server.read()).figures;
        const own = { booklets: tally.booklets + 3, hours: 12.5, workingDays: 4, weeks: 2.5 };
        const layers = [
          ...[{ stepId: '', name: 'Wood', coats: [0, 0], colour: 'wood', thickness: 6, thickness_mm: null } as const],
          ...[
            {
              stepId: 's',
              name: 'Oil',
              coats: [1, 1],
              colour: 'oil-size',
              thickness: 0.4,
              thickness_mm: null,
            } as const,
          ],
        ];
        const section = { buildUp: 'Oil gilding', zoneIds: [], leaf: [], timber: 'Lime', layers };
        const gross_minor = price.gross_minor - 5000;
        const sections = { before: [section], after: [] };
        read = { alternatives: [{ ...total, gross_minor, tally: own, sections }] };
        await open(IssueViewPage, view);
        const [base, bare] = cells();
        const written = (minor: number) => (minor / 100).toLocaleString('en', { minimumFractionDigits: 2 });
        expect([base[0], base[1], base[5]]).toEqual(['The base', String(tally.booklets), written(price.gross_minor)]);
        expect([bare[0], bare[1]]).toEqual(['Bare at the back', `${tally.booklets + 3}+3`]);
        expect(bare.slice(2, 5).map((cell) => Number.parseFloat(cell))).toEqual([12.5, 4, 2.5]);
        expect(bare[5]).toBe(`${written(gross_minor)}−50.00`);
        expect(sides()).toEqual([
          ['In the base', 1],
          ['With “Bare at the back”', 0],
        ]);
      });

      it('says nothing of what issues did not keep when it was made, and leaves out what was not offered', async () => {
        const empty = { ...alternative, id: ids.edge, name: 'Nothing in it' };
        server.settings = { ...server.settings, alternatives: [alternative, empty] };
        read = { alternatives: [total] };
        await open(IssueViewPage, view);
        const unknown = expect.stringMatching(/^–/) as string;
        const price = expect.stringMatching(/^550.00/) as string;
        expect(cells().slice(1)).toEqual([['Bare at the back', unknown, unknown, unknown, unknown, price]]);
        expect(sides()).toEqual([]);
      });
    });
  });

  it('gives everybody a bench sheet for each piece, the bench nothing else', async () => {
    server.isPriced = false;
    await open(SheetsPage, {}, ['bench']);
    expect(links()).toEqual([['Bench sheet, Base', `/sheets/${ids.piece}`]]);
  });
});
