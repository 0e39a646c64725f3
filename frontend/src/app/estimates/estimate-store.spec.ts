import { TestBed } from '@angular/core/testing';
import { ActivatedRoute, convertToParamMap, provideRouter } from '@angular/router';
import { of } from 'rxjs';
import type { MemberContent } from '#shared/estimates/member';
import { EstimateServer, ids, refusal, workspaceOn } from '../../test/estimate-server';
import { signIn, words } from '../../test/sign-in';
import { Notices } from '../core/problems/notices';
import { Saving } from '../core/saving/saving';
import type { Conflict, Side } from './draft/conflict';
import { EstimateStore } from './estimate-store';
import { MemberActions } from './members/member-actions';

describe('EstimateStore', () => {
  let server: EstimateServer;
  let store: EstimateStore;
  let choose: (conflict: Conflict) => Side;
  let report: ((difference: string) => void) | undefined;

  const settle = () => jest.advanceTimersByTimeAsync(0);
  const wait = (time_ms: number) => jest.advanceTimersByTimeAsync(time_ms);
  const content = (id: string): MemberContent => {
    const { id: _id, ...rest } = store.members().find((one) => one.id === id)!;
    return rest;
  };
  const setLength = (length_mm: number) =>
    store.changeMember(ids.edge, { ...content(ids.edge), shape: { kind: 'rectangle', length_mm, height_mm: 60 } });
  const rename = (id: string, name: string) => store.changeMember(id, { ...content(id), name });
  const area_mm2 = () => store.figures()!.members.find(({ memberId }) => memberId === ids.edge)!.developed_mm2;

  async function open(roles: Parameters<typeof signIn>[0] = ['estimator']): Promise<void> {
    TestBed.configureTestingModule({
      providers: [
        words,
        provideRouter([]),
        { provide: ActivatedRoute, useValue: { queryParamMap: of(convertToParamMap({})) } },
        ...workspaceOn(server, { choose: (conflict) => choose(conflict), ...(report ? { report } : {}) }),
      ],
    });
    signIn(roles);
    store = TestBed.inject(EstimateStore);
    void store.open({ jobId: ids.job, estimateId: ids.estimate });
    await settle();
    await settle();
  }

  beforeEach(() => {
    jest.useFakeTimers();
    server = new EstimateServer();
    choose = () => 'mine';
    report = undefined;
  });
  afterEach(() => jest.useRealTimers());

  describe('shows figures', () => {
    it('of the server as long as nothing is typed', async () => {
      await open();
      expect(store.figures()).toEqual(server.figures());
      expect(area_mm2()).toBe(1000 * 60);
    });

    it('of its own while one types, before anything is sent, and the server’s afterwards', async () => {
      await open();
      setLength(1200);
      expect(area_mm2()).toBe(1200 * 60);
      expect(server.arrived).toEqual([]);
      const price_minor = store.priced()!.price.net_minor;
      await wait(700);
      expect(server.arrived).toHaveLength(1);
      expect(store.priced()!.price.net_minor).toBe(price_minor);
      expect(store.figures()).toEqual(server.figures());
    });

    it('with risk drawn anew after the last key, the price marked until then where it hangs on it', async () => {
      server.settings = { ...server.settings, contingency: { way: 'risk', percent: '0' } };
      await open();
      setLength(3000);
      expect([store.isRiskPending(), store.isPricePending()]).toEqual([true, true]);
      await wait(400);
      expect([store.isRiskPending(), store.isPricePending()]).toEqual([false, false]);
      const own_minor = store.priced()!.price.net_minor;
      await wait(300);
      expect(store.priced()!.price.net_minor).toBe(own_minor);
    });

    it('and tells where the server works the same draft to another figure', async () => {
      const told: string[] = [];
      report = (difference) => told.push(difference);
      await open();
      expect(told).toEqual([]);
      server.spoil = (figures) => ({ ...figures, tally: { ...figures.tally, members: 4 } });
      setLength(1100);
      await wait(700);
      expect(told).toEqual(['tally.members: 3 ≠ 4']);
    });

    it('and asks for another page where the server works with another calculator', async () => {
      server.spoil = (figures) => ({ ...figures, calculatorVersion: 99 });
      await open();
      expect(store.isOutdated()).toBe(true);
    });

    it('of the server’s only, without prices, to the bench', async () => {
      server.isPriced = false;
      await open(['bench']);
      expect([store.mayEdit(), store.priced(), store.card()]).toEqual([false, undefined, undefined]);
    });

    it('of a choice of alternatives, worked on the page', async () => {
      server.members[1] = {
        ...server.members[1],
        content: { ...server.members[1].content, alternativeId: '018f0000-0000-7000-8000-000000000177' },
      };
      server.settings = {
        ...server.settings,
        alternatives: [
          { id: '018f0000-0000-7000-8000-000000000177', name: 'With legs', group: '', note: '', replaces: [] },
        ],
      };
      await open();
      expect(store.figures()!.tally.members).toBe(1);
      store.choose(['018f0000-0000-7000-8000-000000000177']);
      expect(store.figures()!.tally.members).toBe(3);
    });
  });

  describe('saves', () => {
    it('600 ms after the last key, once, with what was typed last', async () => {
      await open();
      rename(ids.edge, 'Top');
      await wait(500);
      rename(ids.edge, 'Top rim');
      await wait(500);
      expect(server.arrived).toEqual([]);
      await wait(200);
      expect(server.arrived.map((changes) => changes.map(({ id, version }) => [id, version]))).toEqual([
        [[ids.edge, 1]],
      ]);
      expect(server.member(ids.edge)?.name).toBe('Top rim');
      expect(TestBed.inject(Saving).hasUnsent()).toBe(false);
    });

    it('with one request in flight, the next from the version the first one made', async () => {
      await open();
      let pass: () => void = () => undefined;
      server.gate = new Promise((resolve) => (pass = resolve));
      rename(ids.edge, 'First');
      await wait(700);
      rename(ids.edge, 'Second');
      rename(ids.leg, 'Leg, front');
      await wait(2000);
      expect(server.arrived).toHaveLength(1);
      pass();
      await wait(10);
      expect(server.arrived[1].map(({ id, version }) => [id, version])).toEqual([
        [ids.edge, 2],
        [ids.leg, 1],
      ]);
      expect([server.member(ids.edge)?.name, server.member(ids.leg)?.name]).toEqual(['Second', 'Leg, front']);
    });

    it('again and again while the server is away, and loses nothing typed meanwhile', async () => {
      await open();
      server.failures.push(refusal(0), refusal(503));
      rename(ids.edge, 'Rim');
      await wait(700);
      expect(TestBed.inject(Saving).state()).toBe('waiting');
      rename(ids.leg, 'Foot');
      await wait(1000);
      await wait(2000);
      expect(server.arrived).toHaveLength(3);
      expect([server.member(ids.edge)?.name, server.member(ids.leg)?.name]).toEqual(['Rim', 'Foot']);
      expect([TestBed.inject(Saving).state(), TestBed.inject(Saving).hasUnsent()]).toEqual(['kept', false]);
    });

    it('nothing where typing came back to what is kept', async () => {
      await open();
      rename(ids.edge, 'Other');
      rename(ids.edge, 'Top edge');
      await wait(700);
      expect(server.arrived).toEqual([]);
      expect(TestBed.inject(Saving).hasUnsent()).toBe(false);
    });

    it('what was refused not again until it is edited, and everything else without it', async () => {
      await open();
      const path = ['body', 'changes', 0, 'content', 'name'];
      server.failures.push(refusal(400, { errors: [{ path, message: 'Please fill this in.' }] }));
      rename(ids.edge, 'Bad');
      rename(ids.leg, 'Good');
      await wait(700);
      expect(store.refusals()).toEqual([{ id: ids.edge, path: 'name', text: 'Please fill this in.' }]);
      expect([server.member(ids.edge)?.name, server.member(ids.leg)?.name]).toEqual(['Top edge', 'Good']);
      rename(ids.edge, 'Better');
      await wait(700);
      expect(store.refusals()).toEqual([]);
      expect(server.member(ids.edge)?.name).toBe('Better');
    });

    it('at once when asked to', async () => {
      await open();
      rename(ids.edge, 'Now');
      const flushed = store.flush();
      await settle();
      const left = flushed.then((isKept) => [isKept, TestBed.inject(Saving).hasUnsent()]);
      await expect(left).resolves.toEqual([true, false]);
      expect(server.member(ids.edge)?.name).toBe('Now');
    });
  });

  describe('where somebody else was faster', () => {
    it.each<[Side, string]>([
      ['mine', 'Mine'],
      ['theirs', 'Theirs'],
    ])('shows both sides and lets %s stand', async (side, name) => {
      const seen: Conflict[] = [];
      choose = (conflict) => {
        seen.push(conflict);
        return side;
      };
      await open();
      rename(ids.edge, 'Mine');
      rename(ids.leg, 'Leg, back');
      server.changeElsewhere(ids.edge, { name: 'Theirs' });
      await wait(700);
      expect(
        seen.map(({ mine, theirs }) => [(mine.content as MemberContent).name, (theirs as MemberContent).name]),
      ).toEqual([['Mine', 'Theirs']]);
      expect([server.member(ids.edge)?.name, server.member(ids.leg)?.name]).toEqual([name, 'Leg, back']);
      expect(store.members().map((one) => one.name)).toEqual([name, 'Leg, back']);
    });

    it('lets one’s own entry bring a removed member back', async () => {
      await open();
      rename(ids.leg, 'Still here');
      server.changeElsewhere(ids.leg, null);
      await wait(700);
      expect(server.member(ids.leg)?.name).toBe('Still here');
    });

    it('puts nothing back by an answer that was overtaken by what was kept meanwhile', async () => {
      await open();
      const overtaken = server.read();
      const reading = jest
        .spyOn(server, 'read')
        .mockReturnValueOnce(new Promise((go) => setTimeout(go, 1000, overtaken)));
      const read = store.reload();
      rename(ids.edge, 'Rim');
      await wait(900);
      expect(server.member(ids.edge)?.name).toBe('Rim');
      await wait(200);
      await read;
      expect(store.members().map((one) => one.name)).toEqual(['Rim', 'Leg']);
      expect(store.head()?.version).toBe(2);
      expect(reading).toHaveBeenCalledTimes(2);
    });

    it('brings their other changes along after one’s own were kept', async () => {
      await open();
      server.changeElsewhere(ids.leg, { name: 'Leg, turned' });
      rename(ids.edge, 'Rim');
      await wait(700);
      await settle();
      expect(store.members().map((one) => one.name)).toEqual(['Rim', 'Leg, turned']);
      expect(store.figures()).toEqual(server.figures());
    });
  });

  describe('undoes', () => {
    it('a word as one step, and does it again', async () => {
      await open();
      rename(ids.edge, 'R');
      rename(ids.edge, 'Rim');
      expect(store.undo()).toEqual([ids.edge]);
      expect(content(ids.edge).name).toBe('Top edge');
      expect(store.redo()).toEqual([ids.edge]);
      expect(content(ids.edge).name).toBe('Rim');
      await wait(700);
      expect(server.member(ids.edge)?.name).toBe('Rim');
    });

    it('what was kept already, as a change of its own', async () => {
      await open();
      rename(ids.edge, 'Rim');
      await wait(3000);
      store.undo();
      await wait(700);
      expect(server.arrived[1].map(({ id, version }) => [id, version])).toEqual([[ids.edge, 2]]);
      expect(server.member(ids.edge)?.name).toBe('Top edge');
    });

    it('a removal, with everything the member had', async () => {
      await open();
      const before = content(ids.edge);
      TestBed.inject(MemberActions).remove(store.members()[0]);
      await wait(700);
      expect(server.member(ids.edge)).toBeUndefined();
      store.undo();
      await wait(700);
      expect(server.member(ids.edge)).toEqual(before);
    });

    it('another rate card that was taken, and takes it again', async () => {
      await open();
      rename(ids.edge, 'Rim');
      await store.takeCard(ids.piece);
      expect([server.rateCardId, server.member(ids.edge)?.name]).toEqual([ids.piece, 'Rim']);
      store.undo();
      await wait(10);
      expect([server.rateCardId, store.head()?.rateCardId]).toEqual([ids.card, ids.card]);
      store.redo();
      await wait(10);
      expect(server.rateCardId).toBe(ids.piece);
      expect(store.undo()).toEqual([]);
      await wait(10);
      expect(store.undo()).toEqual([ids.edge]);
    });

    it('no rate card where somebody else took one since', async () => {
      await open();
      await store.takeCard(ids.piece);
      server.rateCardId = ids.leg;
      await store.reload();
      store.undo();
      await wait(10);
      expect(server.rateCardId).toBe(ids.leg);
      expect(TestBed.inject(Notices).current()[0].text).toContain('The rate card was changed by somebody else since');
    });

    it('nothing somebody else changed since, and says so', async () => {
      await open();
      rename(ids.edge, 'Rim');
      await wait(700);
      server.changeElsewhere(ids.edge, { name: 'Cornice' });
      await store.reload();
      expect(store.undo()).toEqual([]);
      expect(content(ids.edge).name).toBe('Cornice');
      expect(TestBed.inject(Notices).current()[0].text).toContain('was changed by somebody else since');
    });
  });

  describe('with whole members', () => {
    it('duplicates, mirrors and moves them in one request', async () => {
      await open();
      const actions = TestBed.inject(MemberActions);
      actions.duplicate(store.members()[0]);
      actions.mirror(store.members()[0]);
      actions.shift(store.members()[0], 1);
      expect(store.members().map((one) => one.name)).toEqual(['Top edge, other hand', 'Top edge', 'Top edge', 'Leg']);
      await wait(700);
      expect(server.arrived).toHaveLength(1);
      const zoneIds = server.members.flatMap((row) => row.content.zones.map((one) => one.id));
      expect(new Set(zoneIds).size).toBe(3);
    });
  });
});
