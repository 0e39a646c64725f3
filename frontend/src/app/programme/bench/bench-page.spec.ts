import { TestBed, type ComponentFixture } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import type { BenchDay } from '#shared/programme/bench-day-schema';
import type { BenchTask } from '#shared/programme/bench-task';
import { signIn, words } from '../../../test/sign-in';
import { NOW } from '../../core/now';
import { Notices } from '../../core/problems/notices';
import { AnsweringForSpecs, buttonIn, refusal, spoken, type AskedParts } from '../answering-for-specs';
import { BenchPage } from './bench-page';

const task = (taskId: string, change: Partial<BenchTask> = {}): BenchTask => ({
  ...{ estimateId: 'e1', taskId, jobNumber: '27-001', jobTitle: 'Pier table', piece: 'Pier table', lot: 'Apron' },
  ...{ kind: 'burnish', name: 'Burnish', coat: 1, coats: 1, portion: 1, portions: 1, grade: 'Gilder', with: [] },
  ...{ startsAt: '2027-01-05T09:00:00.000Z', endsAt: '2027-01-05T10:40:00.000Z', handsOn_minutes: 100 },
  ...{ state: 'ready', readyAt: '2027-01-05T08:00:00.000Z', windowClosesAt: '2027-01-05T12:00:00.000Z', waits: [] },
  ...change,
});
const dayOf = (change: Partial<BenchDay> = {}): BenchDay => ({
  ...{ day: '2027-01-05', timeZone: 'Europe/Dublin', person: { id: 'gina', name: 'Gina' }, people: [] },
  ...{ tasks: [], coatsReady: [], windowsClosing: [], nextDay: null },
  ...change,
});

describe('BenchPage', () => {
  let fixture: ComponentFixture<BenchPage>;
  let server: AnsweringForSpecs;
  const element = () => fixture.nativeElement as HTMLElement;
  const current = () => element().querySelector('article.now') as HTMLElement;
  const settle = async () => {
    await fixture.whenStable();
    TestBed.tick();
    await fixture.whenStable();
  };

  async function open(
    readBenchDay: (parts: AskedParts) => unknown,
    markTask: (parts: AskedParts) => unknown = () => task('a'),
  ) {
    const markAsPlanned = () => ({ marked: 1 });
    server = new AnsweringForSpecs({ readBenchDay, markTask, markAsPlanned, listFeeds: () => ({ items: [] }) });
    const now = { provide: NOW, useValue: () => new Date('2027-01-05T09:00:00Z') };
    TestBed.configureTestingModule({ providers: [words, provideRouter([]), server.provider, now] });
    signIn(['bench']);
    fixture = TestBed.createComponent(BenchPage);
    await settle();
  }
  async function press(text: string, within: Element = element()) {
    buttonIn(within, text).click();
    await settle();
  }

  it('puts what is in work before what could be begun, with the time its window closes', async () => {
    const begun = task('b', { name: 'Lay', state: 'started' });
    await open(() => dayOf({ tasks: [task('a'), begun] }));
    expect(spoken(current().querySelector('h2'))).toBe('Lay');
    expect(spoken(current().querySelector('.closes'))).toBe('Window open until 12:00');
    expect(current().querySelector('.window')?.getAttribute('aria-label')).toBe('25% of the window is over');
    expect([...element().querySelectorAll('.list .what > :first-child')].map(spoken)).toEqual(['Burnish']);
  });

  it('keeps the window in view beside the button while something is in work', async () => {
    await open(() => dayOf({ tasks: [task('a', { state: 'started' })] }));
    expect(spoken(current().querySelector('.thumb'))).toContain('good until 12:00');
  });

  it('says that a window has closed, and to have it looked at', async () => {
    await open(() => dayOf({ tasks: [task('a', { windowClosesAt: '2027-01-05T08:30:00.000Z' })] }));
    expect(spoken(current().querySelector('.closes'))).toMatch(/^The window closed at 08:30/);
    expect(current().classList).toContain('late');
  });

  it('marks a task as begun, and reads the day again', async () => {
    let state: BenchTask['state'] = 'ready';
    await open(
      () => dayOf({ tasks: [task('a', { state })] }),
      () => {
        state = 'started';
        return task('a', { state });
      },
    );
    await press('Start', current());
    expect(server.of('markTask')).toEqual([
      { params: { estimateId: 'e1' }, body: { taskId: 'a', mark: 'started', at: null, left_minutes: null } },
    ]);
    expect(spoken(current())).toContain('In work since 09:00');
    expect(buttonIn(current(), 'Finished').disabled).toBe(false);
  });

  it('takes it that what nobody marked in time was done as planned, or begun, and never of what is to come', async () => {
    const at = (startsAt: string, endsAt: string) => ({
      ...{ startsAt: `2027-01-05T${startsAt}:00.000Z`, endsAt: `2027-01-05T${endsAt}:00.000Z` },
    });
    const [done, begun, later] = [
      task('a', at('08:00', '08:40')),
      task('b', at('08:30', '10:00')),
      task('c', at('09:00', '10:00')),
    ];
    await open(() => dayOf({ tasks: [done, begun, later] }));
    const said = [...element().querySelectorAll('button')].map(spoken).filter((text) => text.endsWith('as planned'));
    expect(said).toEqual(['Done as planned', 'Begun as planned']);
    const read = server.of('readBenchDay').length;
    await press('Begun as planned');
    expect(server.of('markAsPlanned')).toEqual([{ params: { estimateId: 'e1' }, body: { taskIds: ['b'] } }]);
    expect(server.of('readBenchDay')).toHaveLength(read + 1);
  });

  it('says why something was not marked, and leaves it as it was', async () => {
    await open(
      () => dayOf({ tasks: [task('a')] }),
      () => {
        throw refusal(422, 'The job is not accepted, so nothing of it is worked yet.');
      },
    );
    await press('Start', current());
    const told = TestBed.inject(Notices).current();
    expect(told.map(({ text }) => text)).toEqual(['The job is not accepted, so nothing of it is worked yet.']);
    expect(buttonIn(current(), 'Start').disabled).toBe(false);
  });

  it('offers no start for what still dries, and says until when', async () => {
    await open(() => dayOf({ tasks: [task('a', { state: 'drying', readyAt: '2027-01-05T11:00:00.000Z' })] }));
    expect(spoken(current())).toContain('drying, ready 11:00');
    expect([...current().querySelectorAll('button')]).toEqual([]);
  });

  it('leads to the next day with work, where this one has none', async () => {
    await open(({ query }) =>
      query?.['day'] === '2027-01-18'
        ? dayOf({ day: '2027-01-18', tasks: [task('c', { name: 'Gesso' })] })
        : dayOf({ nextDay: '2027-01-18' }),
    );
    expect(spoken(element().querySelector('app-empty-state'))).toContain('Nothing more to do this day');
    await press('Next work: Monday 18 January');
    expect(spoken(current().querySelector('h2'))).toBe('Gesso');
  });

  it('tells somebody nobody has named yet how they come to have a day', async () => {
    await open(() => dayOf({ person: null }));
    expect(spoken(element().querySelector('app-empty-state'))).toContain('Nobody at the bench has your name yet');
  });

  it('asks whose day is meant, where somebody sees several and has none of their own', async () => {
    const people = ['Jonah', 'Tobias'].map((name) => ({ id: name, name }));
    await open(() => dayOf({ person: null, people }));
    expect(spoken(element().querySelector('app-empty-state'))).toContain('Whose day is it to be?');
    expect(element().querySelector('select')?.selectedOptions[0]?.textContent).toContain('Choose somebody');
  });
});
