import type { Type } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { ActivatedRoute, convertToParamMap, provideRouter } from '@angular/router';
import { BehaviorSubject, map } from 'rxjs';
import type { Role } from '#shared/actor/role';
import type { MemberOrnament } from '#shared/estimates/member';
import { EstimateServer, ids, workspaceOn, zone } from '../../test/estimate-server';
import { signIn, words } from '../../test/sign-in';
import { CarvePage } from './carve/carve-page';
import { DryPage } from './dry/dry-page';
import { EstimateStore } from './estimate-store';
import { GildPage } from './gild/gild-page';
import { ZoneSpread } from './gild/zone-spread';

const id = (number: number) => `018f0000-0000-7000-8000-0000000009${number}`;
const eggAndDart: MemberOrnament = {
  id: id(10),
  ornamentId: 'egg-and-dart',
  extent: { way: 'run', run_mm: 900, runs: 1, mitreLeaf_mm: 0, mitreLeaves: 0, centre_mm: null },
  size_mm: null,
  relief: 'middle',
  isUndercut: false,
  plan: 'straight',
  isMirrored: false,
  joinsLearning: false,
  hasOwnPattern: false,
  zoneId: null,
  alternativeId: null,
};

/** A page of one estimate on a server of its own; the member asked for stands in `member`. */
async function open<Page>(page: Type<Page>, roles: readonly Role[] = ['estimator']) {
  const server = new EstimateServer();
  server.changeElsewhere(ids.edge, { ornaments: [eggAndDart] });
  if (!roles.includes('estimator')) server.isPriced = false;
  const member = new BehaviorSubject<string | null>(ids.edge);
  const queryParamMap = member.pipe(map((asked) => convertToParamMap(asked === null ? {} : { member: asked })));
  TestBed.configureTestingModule({
    providers: [
      words,
      provideRouter([]),
      { provide: ActivatedRoute, useValue: { queryParamMap } },
      ...workspaceOn(server),
      ZoneSpread,
    ],
  });
  signIn(roles);
  const store = TestBed.inject(EstimateStore);
  void store.open({ jobId: ids.job, estimateId: ids.estimate });
  await jest.advanceTimersByTimeAsync(1);
  const fixture = TestBed.createComponent(page);
  const element = fixture.nativeElement as HTMLElement;
  const turn = async () => {
    await jest.advanceTimersByTimeAsync(1);
    fixture.detectChanges();
  };
  const settle = async () => {
    await turn();
    await turn();
  };
  await settle();
  const rows = () =>
    [...element.querySelectorAll('app-figure-table tbody tr')].map((row) =>
      [...row.querySelectorAll('td')].map((cell) => cell.textContent?.trim().replace(/[\s\u00a0]+/g, ' ')),
    );
  const entry = (label: string) => {
    const found = [...element.querySelectorAll('label')].find((one) => one.textContent?.trim().startsWith(label));
    return element.querySelector(`#${found?.htmlFor}`) as HTMLInputElement & HTMLSelectElement;
  };
  const type = async (label: string, text: string) => {
    entry(label).value = text;
    entry(label).dispatchEvent(new Event('input'));
    await settle();
  };
  const press = async (text: string) => {
    const button = [...element.querySelectorAll('button')].find((one) => one.textContent?.trim() === text);
    button?.click();
    await settle();
  };
  return { element, entry, member, press, rows, settle, store, type };
}

describe('The places of work', () => {
  beforeEach(() => jest.useFakeTimers());
  afterEach(() => jest.useRealTimers());

  describe('Carve', () => {
    it('fits the repeats anew while a length is typed', async () => {
      const { rows, type, store } = await open(CarvePage);
      // 900 mm hold thirty repeats of 30 mm as they are drawn; 950 mm thirty-two, pressed by 1 %.
      expect(rows()[0]?.slice(0, 3)).toEqual(['Egg and dart middle', '900 mm', '30 of 30 mm as drawn']);
      await type('Length of a run', '95 cm');
      expect(rows()[0]?.[2]).toBe('32 of 29.7 mm pressed 1%');
      const member = store.members().find((one) => one.id === ids.edge);
      expect(member?.ornaments[0]?.extent).toMatchObject({ run_mm: 950 });
      expect(member?.typed['ornaments.0.extent.run_mm']).toBe('95 cm');
    });

    it('keeps what cannot be read out of the draft, and says so', async () => {
      const { element, type, store } = await open(CarvePage);
      await type('Runs on one member', 'some');
      expect(element.querySelector('[role="alert"]')?.textContent).toBeTruthy();
      const extent = store.members().find((one) => one.id === ids.edge)?.ornaments[0]?.extent;
      expect(extent).toMatchObject({ runs: 1 });
    });

    it('takes an ornament away, and tells the rest of the job by ornament', async () => {
      const { element, member, press, rows, settle } = await open(CarvePage);
      member.next(null);
      await settle();
      expect(element.querySelector('h2')?.textContent).toBeTruthy();
      expect(rows()[0]?.slice(0, 2)).toEqual(['Egg and dart', '30']);
      member.next(ids.edge);
      await settle();
      await press('Remove');
      expect(element.textContent).toContain('Nothing is carved on this member yet.');
    });

    it('shows the bench the hours and no entry', async () => {
      const { element, rows } = await open(CarvePage, ['bench']);
      expect(rows()[0]?.[0]).toBe('Egg and dart middle');
      expect(element.querySelector('app-ornament-form, app-ornament-picker')).toBeNull();
      expect(element.textContent).toContain('Modelling');
    });
  });

  describe('Gild', () => {
    const column = (row: readonly (string | undefined)[] | undefined, key: number) => row?.[key];

    it('shows each zone with its leaf at the list price, and follows another build-up', async () => {
      const { entry, rows, settle, store } = await open(GildPage);
      const [first] = rows();
      const leaves = Number(column(first, 4));
      // A booklet of 25 leaves costs 52.00, so each leaf 2.08.
      expect(Number(column(first, 5))).toBeCloseTo(leaves * 2.08, 0);
      const build = entry('Build-up');
      build.value = 'white-glazes';
      build.dispatchEvent(new Event('change'));
      await settle();
      expect(column(rows()[0], 1)).toBe('White ground with transparent glazes');
      expect(column(rows()[0], 2)).toBe('no leaf');
      const [changed] = store.members().find((one) => one.id === ids.edge)?.zones ?? [];
      expect([changed?.buildUpId, changed?.leafId]).toEqual(['white-glazes', null]);
    });

    it('adds a zone for what the others leave', async () => {
      const { press, rows, type } = await open(GildPage);
      await type('Share of the surface', '70');
      await press('Add a zone');
      expect(rows()).toHaveLength(2);
      expect(rows().map((row) => row[0])).toEqual(['All of it', 'Zone 2']);
      // 1000 × 60 mm: 420 and 180 cm².
      expect(rows().map((row) => row[3])).toEqual(['420 cm²', '180 cm²']);
    });

    it('names the build-up of an alternative that is not chosen', async () => {
      const { rows, settle, store } = await open(GildPage);
      const edge = store.members().find((one) => one.id === ids.edge);
      if (!edge) throw new Error('there is no edge');
      const { id: _id, ...content } = edge;
      store.changeSettings({
        alternatives: [{ id: id(40), name: 'Toned, not gilt', group: '', note: '', replaces: [] }],
      });
      const toned = { id: id(41), name: 'All of it, toned', buildUpId: 'toned-back', leafId: null };
      const taken = zone({ ...toned, alternativeId: id(40) });
      store.changeMember(ids.edge, { ...content, zones: [...content.zones, taken] });
      await settle();
      expect(rows()[1]?.slice(0, 2)).toEqual([
        'All of it, toned in “Toned, not gilt”, figures with that choice, in no sum',
        'Toned back',
      ]);
    });

    it('works a zone of an alternative that is not chosen as if it was, and adds it to no sum', async () => {
      const { element, rows, settle, store } = await open(GildPage);
      const total = () => element.querySelector('app-figure-table tfoot')?.textContent?.replace(/[\s\u00a0]+/g, ' ');
      const edge = store.members().find((one) => one.id === ids.edge);
      if (!edge) throw new Error('there is no edge');
      const { id: _id, ...content } = edge;
      const [base] = content.zones;
      const alternative = { id: id(42), name: 'Matte', group: '', note: '', replaces: [base.id] };
      const leaves = rows()[0]?.[4];
      store.changeSettings({ alternatives: [alternative] });
      const matte = zone({ id: id(43), name: 'All of it, matte', buildUpId: 'water-burnished', alternativeId: id(42) });
      store.changeMember(ids.edge, { ...content, zones: [base, { ...matte, take: base.take, relief: base.relief }] });
      await settle();
      // The same surface in the same way takes the same leaf.
      expect(rows()[1]?.[4]).toBe(leaves);
      expect(rows()[1]?.[4]).toMatch(/^\d/);
      expect(total()).toContain(`600 cm² ${leaves} `);
    });

    it('shows the bench no money', async () => {
      const { element, rows } = await open(GildPage, ['bench']);
      expect(rows()[0]).toHaveLength(5);
      expect(element.textContent).not.toContain('€');
      expect(element.querySelector('app-zone-form')).toBeNull();
    });

    it('shows the hours of recutting beside the hands-on hours, and why', async () => {
      const { element, entry, settle } = await open(GildPage);
      expect(element.querySelector('app-zone-section')?.textContent).not.toContain('Recutting');
      const recut = entry('Recut in gesso');
      recut.selectedIndex = [...recut.options].findIndex(({ text }) => text === 'recut as usual');
      recut.dispatchEvent(new Event('change'));
      await settle();
      const figure = [...element.querySelectorAll('app-zone-section div')].find((one) =>
        one.textContent?.includes('Recutting'),
      );
      // Nothing carved on 0.06 m²: 8 h a square metre, a house value.
      expect(figure?.querySelector('dd')?.textContent?.trim().replace(/\s/g, ' ')).toBe('0.48 h');
      figure?.querySelector('button')?.click();
      await settle();
      expect(element.querySelector('app-reason-panel')?.textContent).toContain('a square metre');
    });

    it('takes old work on from the whole job, says what that does, and takes it back', async () => {
      const { element, member, settle, store } = await open(GildPage);
      member.next(null);
      await settle();
      const told = () => element.querySelector('app-restoration-form')?.textContent?.replace(/[\s\u00a0]+/g, ' ') ?? '';
      const tick = () => element.querySelector('app-restoration-form input') as HTMLInputElement;
      expect(told()).not.toContain('lead');
      tick().click();
      await settle();
      expect(store.settings()?.restoration).toBe(true);
      // The one zone there is, 1000 × 60 mm.
      expect(told()).toContain('600 cm² in plan, zones: 1 of 1');
      expect(told()).toContain('Cleaning and consolidating come with “Ingilding and local repair”.');
      store.undo();
      await settle();
      expect([store.settings()?.restoration, tick().checked, told().includes('lead')]).toEqual([false, false, false]);
    });

    it('counts the hours of old work where a zone is cleaned and consolidated', async () => {
      const { element, entry, member, settle, store } = await open(GildPage);
      store.changeSettings({ restoration: true });
      const build = entry('Build-up');
      build.value = 'local-repair';
      build.dispatchEvent(new Event('change'));
      member.next(null);
      await settle();
      const told = element.querySelector('app-restoration-form')?.textContent?.replace(/[\s\u00a0]+/g, ' ');
      // 8 h a square metre each on 0.06 m².
      expect(told).toContain('Cleaning0.48 h');
      expect(told).toContain('Consolidating0.48 h');
      expect(told).not.toContain('come with');
    });

    it('lays a build-up on a zone and on a bare member in one step that can be undone', async () => {
      const { store } = await open(GildPage);
      const spread = TestBed.inject(ZoneSpread);
      const source = zone({ id: id(20), name: 'Source', buildUpId: 'oil-12-hour', chosenStepIds: ['seal'] });
      const targets = spread.question(source).groups.flatMap((group) => group.targets);
      expect(targets.map(({ zoneId }) => zoneId !== null)).toEqual([true, false]);
      spread.lay(source, targets);
      const laid = () => store.members().map(({ zones }) => zones.map(({ buildUpId }) => buildUpId));
      expect(laid()).toEqual([['oil-12-hour'], ['oil-12-hour']]);
      store.undo();
      expect(laid()).toEqual([['water-burnished'], []]);
    });
  });

  describe('Dry', () => {
    it('tells lots, steps and batches, and lays them anew in another air', async () => {
      const { element, rows, store, type } = await open(DryPage);
      expect(rows()[0]?.[0]).toBe('Water gilding, burnished Top edge');
      expect(element.querySelector('app-lot-steps')?.textContent).toContain('Gesso');
      expect(element.querySelector('app-batch-list')?.textContent).toContain('Dry glue');
      const before = store.figures()?.dry.elapsed_minutes ?? 0;
      await type('Humidity', '80');
      expect(store.settings()?.shop.humidity_percent).toBe(80);
      expect(store.figures()?.dry.elapsed_minutes).toBeGreaterThan(before);
      // Wood at 20 °C and 80 % rests at 16.0 % (Wood Handbook, Table 4-2), far from the 8 to 9 % of a dry room.
      expect(element.textContent).toContain('points apart');
    });

    describe('lots', () => {
      const openTwo = async (roles: readonly Role[] = ['estimator']) => {
        const place = await open(DryPage, roles);
        if (!roles.includes('estimator')) return { ...place, lots: () => [], choose: () => Promise.resolve() };
        const leg = place.store.members().find((one) => one.id === ids.leg);
        if (!leg) throw new Error('there is no leg');
        const { id: _id, ...content } = leg;
        place.store.changeMember(ids.leg, { ...content, zones: [zone({ id: id(30), name: 'All of it' })] });
        await place.settle();
        const lots = () =>
          place
            .rows()
            .map(([name]) => name)
            .filter((name) => name?.startsWith('Legs') || name?.includes('gilding'));
        const choose = async (memberName: string, label: string) => {
          const line = [...place.element.querySelectorAll('app-lot-members li')].find((one) =>
            one.textContent?.includes(memberName),
          );
          const select = line?.querySelector('select') as HTMLSelectElement;
          select.selectedIndex = [...select.options].findIndex(({ text }) => text.trim() === label);
          select.dispatchEvent(new Event('change'));
          await place.settle();
        };
        return { ...place, lots, choose };
      };
      const handsOn = (store: EstimateStore) =>
        (store.figures()?.dry.lots ?? []).reduce((sum, lot) => sum + lot.handsOn_minutes, 0);

      it('coats a member on its own, renames its lot, and goes back to the proposal, each to be undone', async () => {
        const { choose, entry, lots, press, settle, store } = await openTwo();
        expect(lots()).toEqual(['Water gilding, burnished Top edge, Leg']);
        const before = handsOn(store);
        await choose('Leg', 'on its own');
        expect(lots()).toEqual(['Water gilding, burnished Top edge', 'Leg: Water gilding, burnished Leg']);
        // Ten steps and more of the second lot are set up for themselves, 24 minutes each.
        expect(handsOn(store) - before).toBeGreaterThanOrEqual(10 * 24);
        store.undo();
        await settle();
        expect([lots().length, handsOn(store)]).toEqual([1, before]);
        store.redo();
        await settle();
        await choose('Top edge', 'in “Leg”');
        expect(lots()).toEqual(['Leg: Water gilding, burnished Top edge, Leg']);
        entry('Name of the lot').value = 'Frame';
        entry('Name of the lot').dispatchEvent(new Event('change'));
        await settle();
        expect(lots()).toEqual(['Frame: Water gilding, burnished Top edge, Leg']);
        await press('Back to the proposal');
        expect(store.members().map(({ lot }) => lot)).toEqual(['', '']);
        expect(handsOn(store)).toBe(before);
      });

      it('brings a member in that is built up alike', async () => {
        const { choose, entry, lots, settle } = await openTwo();
        await choose('Leg', 'on its own');
        const bring = entry('Bring in');
        bring.value = ids.leg;
        bring.dispatchEvent(new Event('change'));
        await settle();
        expect(lots()).toEqual(['Water gilding, burnished Top edge, Leg']);
      });

      it('tells the bench what is coated together and offers nothing to change', async () => {
        const { element, rows } = await openTwo(['bench']);
        expect(rows()[0]?.[0]).toBe('Water gilding, burnished Top edge');
        expect(element.querySelector('app-lot-members')).toBeNull();
      });
    });

    it('minds the engineer’s check of a top on its base', async () => {
      const { element } = await open(DryPage);
      const told = element.querySelector('aside')?.textContent ?? '';
      expect(told.match(/structural engineer/g)).toHaveLength(1);
    });

    it('tells each zone’s hands-on time with the waiting of its lot', async () => {
      const { element, store } = await open(DryPage);
      const cells = [...element.querySelectorAll('app-zone-times tbody td')].map((cell) =>
        cell.textContent?.trim().replace(/[\s\u00a0]+/g, ' '),
      );
      const waiting = element.querySelectorAll('app-lot-table tbody td')[2]?.textContent?.trim();
      expect(cells.slice(0, 2)).toEqual(['Top edge, All of it', 'Water gilding, burnished']);
      expect(cells[2]).toBe(`${(store.figures()?.zones[0]?.hours.likely ?? 0).toFixed(1)} h`);
      expect(cells[3]).toBe(waiting?.replace(/[\s\u00a0]+/g, ' '));
      expect(cells[3]).toMatch(/^\d/);
    });

    it('draws approvals in the ribbon and tells them in a table', async () => {
      const { element } = await open(DryPage);
      const names = [...element.querySelectorAll('app-drying-ribbon .names li')].map((one) => one.textContent?.trim());
      expect(names).toEqual(expect.arrayContaining(['Carving approved', 'Sample board approved', 'Top fitted dry']));
      expect(element.querySelectorAll('app-drying-ribbon rect.hold')).toHaveLength(3);
      expect(element.querySelector('app-hold-table')?.textContent).toContain('5\u00a0working\u00a0days');
    });

    it('says once, beside the air, where nothing dries', async () => {
      const { element, type } = await open(DryPage);
      await type('Humidity', '96');
      const told = [...element.querySelectorAll('.refuse')].map((line) => line.textContent ?? '');
      expect(told.filter((text) => text.includes('nothing dries soundly'))).toHaveLength(1);
    });

    it('shows the bench the air and no entry', async () => {
      const { element } = await open(DryPage, ['bench']);
      expect(element.querySelector('app-air-form input')).toBeNull();
      expect(element.querySelector('app-joint-movement')).toBeNull();
      expect(element.querySelector('app-air-form')?.textContent?.replace(/\u00a0/g, ' ')).toContain('20 °C');
    });
  });
});
