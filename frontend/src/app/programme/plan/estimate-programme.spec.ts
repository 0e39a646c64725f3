import { inputBinding } from '@angular/core';
import { TestBed, type ComponentFixture } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import type { Role } from '#shared/actor/role';
import type { ProgrammeInputs } from '#shared/programme/programme-inputs';
import { personForSpecs } from '#shared/programme/request-for-specs';
import type { ProgrammeAnswer } from '#shared/programme/programme-schema';
import { signIn, words } from '../../../test/sign-in';
import { NOW } from '../../core/now';
import { Notices } from '../../core/problems/notices';
import { AnsweringForSpecs, type AskedParts, buttonIn, refusal, spoken } from '../answering-for-specs';
import { StillObserver } from '../ribbon/ribbon-for-specs';
import { EstimateProgramme } from './estimate-programme';
import { PlanningHereForSpecs } from './planning-here-for-specs';
import { PLANNING_STARTER } from './planning-starter';
import { programmeForSpecs } from './programme-for-specs';

describe('EstimateProgramme', () => {
  let fixture: ComponentFixture<EstimateProgramme>;
  let server: AnsweringForSpecs;
  let told: (string | undefined)[];
  const element = () => fixture.nativeElement as HTMLElement;
  const settle = async () => {
    for (let turn = 0; turn < 3; turn += 1) {
      await fixture.whenStable();
      await new Promise((resolve) => setTimeout(resolve));
      TestBed.tick();
    }
  };
  const stands = programmeForSpecs();
  const further = [personForSpecs('carl', 'carver')];
  const keptInputs = ({ body, version }: AskedParts): ProgrammeAnswer =>
    programmeForSpecs({ inputs: body as ProgrammeAnswer['inputs'], version: (version ?? 0) + 1 });

  afterEach(() => jest.restoreAllMocks());

  interface Opened {
    readonly read?: Partial<ProgrammeAnswer>;
    readonly roles?: readonly Role[];
    readonly keep?: (parts: AskedParts) => unknown;
    readonly now?: string;
  }
  async function open({
    read = {},
    roles = ['estimator'],
    keep = keptInputs,
    // Before the workshop opens on the first day of the plan.
    now = '2027-01-04T07:00:00Z',
  }: Opened = {}) {
    globalThis.ResizeObserver = StillObserver;
    jest.spyOn(HTMLElement.prototype, 'clientWidth', 'get').mockReturnValue(1200);
    jest.spyOn(HTMLElement.prototype, 'clientHeight', 'get').mockReturnValue(600);
    told = [];
    server = new AnsweringForSpecs({
      readProgramme: () => programmeForSpecs(read),
      readShop: () => ({ content: { people: [{ id: 'gina', name: 'Gina' }] } }),
      keepProgramme: keep,
      keepPlan: ({ body, version }) =>
        programmeForSpecs({ plan: body as ProgrammeAnswer['plan'], version: (version ?? 0) + 1 }),
      solveProgramme: () => ({ id: 's', state: 'done', plan: stands.plan }),
    });
    const time = { provide: NOW, useValue: () => new Date(now) };
    const starter = { provide: PLANNING_STARTER, useValue: () => Promise.resolve(new PlanningHereForSpecs()) };
    TestBed.configureTestingModule({ providers: [words, provideRouter([]), server.provider, starter, time] });
    signIn(roles);
    fixture = TestBed.createComponent(EstimateProgramme, {
      bindings: [
        inputBinding('estimateId', () => stands.estimateId),
        inputBinding('tellsDay', () => (day: string | undefined) => told.push(day)),
      ],
    });
    await settle();
  }
  async function press(text: string, within: Element = element()) {
    buttonIn(within, text).click();
    await settle();
  }
  async function type(label: string, text: string) {
    const field = [...element().querySelectorAll('app-field')].find(
      (one) => spoken(one.querySelector('label')) === label,
    );
    const input = field?.querySelector('input') as HTMLInputElement;
    input.value = text;
    input.dispatchEvent(new Event('input'));
    await settle();
  }
  const keptLots = (at: number) => (server.of('keepProgramme')[at].body as ProgrammeInputs).lots;
  const openLot = async () => {
    (element().querySelector('[aria-label="Change how Legs is worked"]') as HTMLButtonElement).click();
    await settle();
  };

  it('says when it is ready, by whom each task is done, and tells the offered day', async () => {
    await open();
    expect(spoken(element().querySelector('h2'))).toMatch(/^Ready on \w+day \d+ January/);
    const stories = [...element().querySelectorAll('g.task')].map((one) => one.getAttribute('aria-label'));
    expect(stories.find((one) => one?.startsWith('Lay – Legs'))).toContain('Gina');
    expect(told.at(-1)).toBe('2027-01-11');
  });

  it('says that a plan has to be made again once something changed under it, and offers no day', async () => {
    await open({ read: { isCurrent: false } });
    expect(spoken(element())).toContain('Something this plan rests on has changed since it was kept.');
    expect(told.at(-1)).toBeUndefined();
    expect(spoken(element().querySelector('.chips'))).not.toMatch(/offer|no plan is sooner/);
  });

  it('offers a day and says how good the plan is, as long as it stands', async () => {
    await open();
    expect(spoken(element().querySelector('.chips'))).toMatch(/offer Mon,? 11 Jan.*no plan is sooner/);
  });

  it('says that no better plan was found, where the new one is ready at the same time', async () => {
    await open();
    await press('Plan it');
    expect(spoken(element())).toContain('No better plan was found: this one, not kept yet, is ready on');
  });

  it('asks the server to move nothing that need not where that is ticked, and says that the plan was kept', async () => {
    await open();
    (element().querySelector('[aria-label=Planning] input[type=checkbox]') as HTMLInputElement).click();
    await settle();
    await press('Plan it on the server');
    expect(server.of('solveProgramme').map(({ body }) => (body as { keepsPlan: boolean }).keepsPlan)).toEqual([true]);
    const said = TestBed.inject(Notices).current();
    expect(said.map(({ text }) => text)).toEqual(['The plan of the server was kept.']);
  });

  it('says what cannot be in words of a plan, not of an issue', async () => {
    const finding = { kind: 'refuse', code: 'programme-breaks-start', values: { task: 'Lay' } } as const;
    await open({ read: { isCurrent: false, broken: [finding] } });
    expect(spoken(element().querySelector('app-finding-list'))).toBe('Cannot be: Lay starts before it may.');
  });

  it('plans in a worker, proposes what came of it, and keeps that', async () => {
    await open({ read: { plan: null, dates: null } });
    expect(spoken(element().querySelector('h2'))).toBe('Not planned yet');
    await press('Plan it');
    expect(spoken(element())).toContain('A new plan, not kept yet: ready on');
    await press('Keep this plan');
    const [{ version, body }] = server.of('keepPlan');
    expect([version, (body as NonNullable<ProgrammeAnswer['plan']>).tasks.length]).toEqual([2, 4]);
    expect(spoken(element().querySelector('h2'))).toMatch(/^Ready on/);
  });

  it('is only read by the office', async () => {
    await open({ roles: ['office'] });
    const buttons = [...element().querySelectorAll('button')].map(spoken);
    expect(buttons).not.toContain('Plan it');
    expect(buttons).not.toContain('Change');
  });

  it('keeps how a lot is worked, in portions and by several', async () => {
    await open();
    await openLot();
    await type('Portions', '2');
    await type('People who may share it', '2');
    await press('Keep it so');
    expect(keptLots(0)).toEqual([{ lotId: 'legs', portions: 2, crew: null, mostPeople: 2, places: null }]);
    expect(element().querySelector('app-lot-form')).toBeNull();
  });

  it('says beside the entry what a lot cannot have, and sends nothing', async () => {
    await open();
    await openLot();
    await type('Places it takes on Long rack', '5');
    await press('Keep it so');
    expect(spoken(element().querySelector('app-lot-form .complaint'))).toBe(
      'Legs takes 5 places of Long rack, and there are 2.',
    );
    expect(server.of('keepProgramme')).toEqual([]);
  });

  it('keeps what two people entered at once, where it is not the same', async () => {
    const theirs = { ...stands.inputs, inHand_days: 5 };
    const keep = (parts: AskedParts) => {
      if (parts.version === 2) throw refusal(412, 'Somebody was faster.', { current: { version: 3, inputs: theirs } });
      return keptInputs(parts);
    };
    await open({ keep });
    await openLot();
    await type('People it takes at once', '2');
    await press('Keep it so');
    const [, { version, body }] = server.of('keepProgramme');
    expect([version, (body as ProgrammeInputs).inHand_days]).toEqual([3, 5]);
    expect(keptLots(1)).toEqual([{ lotId: 'legs', portions: null, crew: 2, mostPeople: null, places: null }]);
  });

  it('leads from a task to how its lot is worked', async () => {
    await open();
    const lay = [...element().querySelectorAll('g.task')].find((one) =>
      one.getAttribute('aria-label')?.startsWith('Lay'),
    );
    lay?.dispatchEvent(new MouseEvent('click', { bubbles: true }));
    await settle();
    await press('How this lot is worked');
    expect(spoken(element().querySelector('app-lot-form'))).toContain('Portions');
  });

  const choose = async (name: string) => {
    const task = [...element().querySelectorAll('g.task')].find((one) =>
      one.getAttribute('aria-label')?.startsWith(name),
    );
    task?.dispatchEvent(new MouseEvent('click', { bubbles: true }));
    await settle();
  };
  const keptHands = () => server.of('keepProgramme').map(({ body }) => (body as ProgrammeInputs).hands);
  const keepHands = () => press('Keep it so', element().querySelector('app-task-hands') as Element);

  it('plans nothing before now, whenever the page was opened', async () => {
    await open({ now: '2027-01-04T15:07:00Z', read: { plan: null, dates: null } });
    await press('Plan it');
    await press('Keep this plan');
    const [{ body }] = server.of('keepPlan');
    const { tasks, from_minutes } = body as NonNullable<ProgrammeAnswer['plan']>;
    expect([from_minutes, Math.min(...tasks.map(({ start_minutes }) => start_minutes))]).toEqual([907, 907]);
  });

  it('says at once that nothing can be put into the past, and changes nothing', async () => {
    await open({ now: '2027-01-04T15:07:00Z' });
    await choose('Lay');
    const at = element().querySelector('#task-at') as HTMLInputElement;
    at.value = '2027-01-04T10:00';
    at.closest('form')?.dispatchEvent(new Event('submit'));
    await settle();
    expect(spoken(element())).toContain('Lay would begin in the past.');
    expect([server.of('keepPlan'), server.of('keepProgramme')]).toEqual([[], []]);
  });

  it('keeps that one step takes two at once, and so the carving, each by itself', async () => {
    const read = { request: { ...stands.request, people: [...stands.request.people, ...further] } };
    await open({ read, keep: (parts) => ({ ...keptInputs(parts), ...read }) });
    await choose('Burnish');
    await type('Hands it takes at once', '2');
    await keepHands();
    await choose('Carving');
    expect(spoken(element().querySelector('app-task-hands'))).toContain(
      'For all carving of this member by this grade.',
    );
    await type('Hands it takes at once', '2');
    await keepHands();
    expect(keptHands()).toEqual([
      [{ workId: 'legs/burnish', crew: 2 }],
      [
        { workId: 'legs/burnish', crew: 2 },
        { workId: 'carve', crew: 2 },
      ],
    ]);
  });

  it('says beside the entry that there are too few hands, and takes an entry back where it is emptied', async () => {
    await open({ read: { inputs: { ...stands.inputs, hands: [{ workId: 'legs/burnish', crew: 2 }] } } });
    await choose('Burnish');
    await type('Hands it takes at once', '3');
    await keepHands();
    expect(spoken(element().querySelector('app-task-hands .complaint'))).toBe(
      'Burnish takes 3 people of Gilder at once, and there are 2.',
    );
    await type('Hands it takes at once', '');
    await keepHands();
    expect(keptHands()).toEqual([[]]);
  });

  it('says why there is no plan at a time nobody works, and changes nothing', async () => {
    await open();
    const lay = [...element().querySelectorAll('g.task')].find((one) =>
      one.getAttribute('aria-label')?.startsWith('Lay'),
    );
    lay?.dispatchEvent(new MouseEvent('click', { bubbles: true }));
    await settle();
    const at = element().querySelector('#task-at') as HTMLInputElement;
    at.value = `${at.value.slice(0, 10)}T03:00`;
    at.closest('form')?.dispatchEvent(new Event('submit'));
    await settle();
    expect(spoken(element())).toContain('There is no such plan. Nothing was changed.');
    expect([server.of('keepPlan'), server.of('keepProgramme')]).toEqual([[], []]);
  });
});
