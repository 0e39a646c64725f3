import { TestBed, type ComponentFixture } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import type { BoardAnswer, BoardJob } from '#shared/programme/board-schema';
import { signIn, words } from '../../../test/sign-in';
import { NOW } from '../../core/now';
import { AnsweringForSpecs, buttonIn, refusal, spoken } from '../answering-for-specs';
import { StillObserver } from '../ribbon/ribbon-for-specs';
import { BoardPage } from './board-page';

const span = { startsAt: '2027-01-05T08:00:00.000Z', endsAt: '2027-01-05T10:00:00.000Z' };
const job = (change: Partial<BoardJob> = {}): BoardJob => ({
  ...{ jobId: 'j1', estimateId: 'e1', number: '27-001', title: 'Pier table', clientName: 'Moss House' },
  ...{ standing: 'accepted', heldUntil: null, startsAt: span.startsAt, finishesAt: span.endsAt },
  tasks: [
    {
      ...{ taskId: 't', lot: 'Apron', name: 'Lay', kind: 'lay', gradeId: 'gilder', personIds: ['gina'], ...span },
      ...{ spans: [span], dryAt: '2027-01-05T16:30:00.000Z', state: 'planned' },
    },
  ],
  ...change,
});
const board = (change: Partial<BoardAnswer> = {}): BoardAnswer => ({
  ...{ timeZone: 'Europe/Dublin', firstDay: '2027-01-04', lastDay: '2027-02-01', clashes: [], load: [], open: [span] },
  ...{ people: [{ id: 'gina', name: 'Gina' }], jobs: [job()], unplanned: [] },
  ...change,
});

describe('BoardPage', () => {
  let fixture: ComponentFixture<BoardPage>;
  let server: AnsweringForSpecs;
  const element = () => fixture.nativeElement as HTMLElement;

  async function open(readBoard: () => unknown) {
    globalThis.ResizeObserver = StillObserver;
    server = new AnsweringForSpecs({ readBoard });
    const now = { provide: NOW, useValue: () => new Date('2027-01-04T09:00:00Z') };
    TestBed.configureTestingModule({ providers: [words, provideRouter([]), server.provider, now] });
    signIn(['owner']);
    fixture = TestBed.createComponent(BoardPage);
    await fixture.whenStable();
    TestBed.tick();
    await fixture.whenStable();
  }

  it('draws each job with its work, who does it and when it is dry, and leads to it', async () => {
    await open(() => board());
    expect(element().querySelector('a[href="/jobs/j1"]')?.textContent).toBe('Pier table');
    const story = element().querySelector('g.task')?.getAttribute('aria-label') ?? '';
    expect(story).toContain('27-001 Pier table.');
    expect(story).toMatch(/Tue 5 Jan, 08:00 to .*10:00, Gina\. Dry on Tue 5 Jan, 16:30\./);
  });

  it('counts what is accepted and what is held, and says until when an offer is held', async () => {
    const held = job({ ...{ jobId: 'j2', estimateId: 'e2', standing: 'held', heldUntil: '2027-01-20' } });
    await open(() => board({ jobs: [held, job()] }));
    expect(spoken(element().querySelector('app-page-header'))).toContain('1 accepted, 1 held');
    expect(spoken(element().querySelector('app-dated-ribbon .names'))).toContain('held until 20 Jan');
  });

  it('says who is promised twice, when and to which jobs', async () => {
    const clash = { kind: 'person', id: 'gina', name: 'Gina', ...span, estimateIds: ['e1', 'e2'] } as const;
    const other = job({ estimateId: 'e2', title: 'Cabinet stand' });
    await open(() => board({ jobs: [job(), other], clashes: [{ ...clash, estimateIds: [...clash.estimateIds] }] }));
    expect(spoken(element().querySelector('.clashes'))).toBe(
      'Gina is promised twice on Tue 5 Jan, 08:00 to 10:00: Pier table, Cabinet stand.',
    );
  });

  it('shows the load of a grade by week, and says in words where it is too much', async () => {
    const week = { gradeId: 'gilder', grade: 'Gilder', week: '2027-01-04', capacity_minutes: 2400, isOver: false };
    await open(() =>
      board({
        load: [
          { ...week, work_minutes: 1200 },
          { ...week, week: '2027-01-11', work_minutes: 3000, isOver: true },
        ],
      }),
    );
    expect([...element().querySelectorAll('app-load-table td')].map(spoken)).toEqual(['50%', '125%']);
    expect(spoken(element().querySelector('.over-list'))).toBe(
      'Gilder, week of 11 Jan: 50 h of work, and 40 h there are.',
    );
  });

  const unplanned = { jobId: 'j3', estimateId: 'e3', number: '27-003', title: 'Overmantel', clientName: 'Moss House' };

  it('names what was accepted and is not planned, and leads to its programme', async () => {
    await open(() => board({ unplanned: [unplanned], jobs: [] }));
    expect(spoken(element())).not.toContain('Nothing is promised yet');
    expect(spoken(element().querySelector('app-page-header'))).toContain('1 not planned yet');
    const link = element().querySelector('app-unplanned-list a');
    expect(spoken(link)).toBe('27-003 Overmantel');
    expect(link?.getAttribute('href')).toBe('/jobs/j3/estimates/e3/dry?part=programme');
  });

  it('goes on to later weeks and back, and says of a job outside them when its work is', async () => {
    const later = { firstDay: '2027-04-05', lastDay: '2027-10-03' };
    await open(() => (server.of('readBoard').length === 2 ? board(later) : board()));
    const press = async (text: string) => {
      buttonIn(element(), text).click();
      TestBed.tick();
      await fixture.whenStable();
      TestBed.tick();
    };
    await press('Later');
    expect(spoken(element().querySelector('app-dated-ribbon .names .minor'))).toBe('5 Jan to 5 Jan');
    expect(element().querySelectorAll('g.task')).toHaveLength(0);
    await press('From this week');
    expect(server.of('readBoard').map(({ query }) => query?.['from'])).toEqual([undefined, '2027-04-05', undefined]);
    expect(element().querySelectorAll('g.task')).toHaveLength(1);
  });

  it('teaches what comes here, as long as nothing is promised', async () => {
    await open(() => board({ jobs: [] }));
    expect(spoken(element().querySelector('app-empty-state'))).toContain('Nothing is promised yet');
    expect(element().querySelector('app-dated-ribbon')).toBeNull();
  });

  it('says why it did not come', async () => {
    await open(() => {
      throw refusal(503, 'The server is busy.');
    });
    expect(spoken(element().querySelector('app-empty-state'))).toContain('The server is busy.');
  });
});
