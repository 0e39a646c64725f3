import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { ActivatedRoute, convertToParamMap, provideRouter } from '@angular/router';
import { BehaviorSubject, map } from 'rxjs';
import type { OrnamentExtent } from '#shared/carving/ornament-use';
import type { MemberOrnament } from '#shared/estimates/member';
import { ornamentForSpecs } from '#shared/estimates/member-for-specs';
import type { MouldingShape } from '#shared/measure/moulding-shape';
import { shapeDefaults } from '#shared/measure/shape-defaults';
import type { Role } from '#shared/actor/role';
import { EstimateServer, ids, workspaceOn } from '../../test/estimate-server';
import { signIn, words } from '../../test/sign-in';
import { newId } from '../core/new-id';
import { UnfinishedEntries } from './draft/unfinished-entries';
import { EstimateStore } from './estimate-store';
import { MeasurePage } from './measure-page';

describe('MeasurePage', () => {
  let server: EstimateServer;
  let store: EstimateStore;
  let fixture: ComponentFixture<MeasurePage>;
  let member: BehaviorSubject<string>;

  const element = () => fixture.nativeElement as HTMLElement;
  const settle = async () => {
    await jest.advanceTimersByTimeAsync(1);
    fixture.detectChanges();
  };
  const field = (label: string): HTMLInputElement => {
    const found = [...element().querySelectorAll('app-field')].find(
      (one) => one.querySelector('label')?.textContent?.trim() === label,
    );
    return found?.querySelector('input, select, textarea') as HTMLInputElement;
  };
  const complaints = () =>
    [...element().querySelectorAll('[role="alert"]')].map((one) => one.textContent?.replace(/\u00a0/g, ' ').trim());
  const button = (text: string) =>
    [...element().querySelectorAll('button')].find((one) => one.textContent?.trim() === text) as HTMLButtonElement;

  async function type(label: string, text: string): Promise<void> {
    const entry = field(label);
    entry.value = text;
    entry.dispatchEvent(new Event('input'));
    await settle();
  }

  async function choose(label: string, text: string): Promise<void> {
    const entry = field(label) as unknown as HTMLSelectElement;
    entry.selectedIndex = [...entry.options].findIndex((option) => option.textContent?.trim() === text);
    entry.dispatchEvent(new Event('change'));
    await settle();
  }

  const click = async (text: string) => {
    button(text).click();
    await settle();
  };
  const show = async (id: string) => {
    member.next(id);
    await settle();
  };
  const shape = (id: string) => store.members().find((one) => one.id === id)?.shape;
  const surface = () =>
    element()
      .querySelector('app-surface-figures dd')
      ?.textContent?.trim()
      .replace(/\u00a0/g, ' ');

  async function open(roles: readonly Role[] = ['estimator'], settings: Parameters<typeof signIn>[1] = {}) {
    member = new BehaviorSubject<string>(ids.edge);
    const queryParamMap = member.pipe(map((id) => convertToParamMap({ member: id })));
    TestBed.configureTestingModule({
      providers: [
        words,
        provideRouter([]),
        { provide: ActivatedRoute, useValue: { queryParamMap } },
        ...workspaceOn(server),
      ],
    });
    signIn(roles, settings);
    store = TestBed.inject(EstimateStore);
    void store.open({ jobId: ids.job, estimateId: ids.estimate });
    await jest.advanceTimersByTimeAsync(1);
    fixture = TestBed.createComponent(MeasurePage);
    await settle();
    await settle();
  }

  beforeEach(() => {
    jest.useFakeTimers();
    server = new EstimateServer();
  });
  afterEach(() => jest.useRealTimers());

  it('works the surface while a length is typed, and sends it as it was written', async () => {
    await open();
    expect(surface()).toBe('600 cm²');
    await type('Length', '2 m');
    expect(surface()).toBe('1,200 cm²');
    await jest.advanceTimersByTimeAsync(700);
    expect(server.member(ids.edge)).toMatchObject({
      shape: { length_mm: 2000 },
      typed: { 'shape.length_mm': '2 m' },
    });
    expect(field('Length').value).toBe('2 m');
  });

  it('reads inches and fractions', async () => {
    await open(['estimator'], { lengthUnit: 'in' });
    await type('Length', '33 7/8');
    // 33.875 in of 25.4 mm.
    expect(shape(ids.edge)).toMatchObject({ length_mm: 860.425 });
  });

  it('says beside its field what cannot be, and keeps the last good figures', async () => {
    await open();
    await type('Length', '2000 mm');
    await type('Length', '2000 m');
    expect(complaints()).toEqual(['Must be less than 100000 mm.']);
    expect(surface()).toBe('1,200 cm²');
  });

  it('says what shape cannot be at the entry that makes it so', async () => {
    server.members = [
      {
        id: ids.edge,
        version: 1,
        content: {
          ...server.members[0].content,
          shape: { kind: 'ring', outerDiameter_mm: 300, innerDiameter_mm: 200 },
        },
      },
    ];
    await open();
    await type('Inner diameter', '300');
    expect(complaints()).toEqual(['The inner diameter must be smaller than the outer one.']);
    // π/4 × (300² − 200²) mm² is 392.7 cm².
    expect(surface()).toBe('393 cm²');
  });

  it('keeps half a length while one looks at another member', async () => {
    await open();
    await type('Length', '12 foo');
    await show(ids.leg);
    expect(field('Length').value).toBe('700');
    await show(ids.edge);
    expect(field('Length').value).toBe('12 foo');
  });

  it('shows again what is kept where half a length is given up, and what an undo brings back', async () => {
    await open();
    await type('Length', '1500');
    await type('Length', '15 foo');
    expect(TestBed.inject(UnfinishedEntries).forget(ids.edge)).toBe(true);
    await settle();
    expect(field('Length').value).toBe('1500');
    store.undo();
    await settle();
    expect(field('Length').value).toBe('1000');
  });

  it('shows what somebody else made of the member', async () => {
    await open();
    server.changeElsewhere(ids.edge, { name: 'Cornice' });
    await store.reload();
    await settle();
    expect(field('Name').value).toBe('Cornice');
  });

  it('puts another shape in the place of one, lengths of the same name coming along', async () => {
    await open();
    await click('Another shape');
    await click('Ellipse');
    expect(shape(ids.edge)).toEqual({ kind: 'ellipse', length_mm: 1000, height_mm: 60 });
  });

  it('builds a profile member by member', async () => {
    await open();
    await click('Another shape');
    await click('Moulding');
    const profile = () => {
      const made = shape(ids.edge);
      return made && 'profile' in made ? made.profile.map(({ element: name }) => name) : [];
    };
    expect(profile()).toEqual(['fillet', 'ovolo', 'fillet']);
    await click('Add on top');
    expect(profile()).toEqual(['fillet', 'ovolo', 'fillet', 'ovolo']);
    const [top] = [...element().querySelectorAll<HTMLElement>('app-profile-editor tbody tr')];
    top.dispatchEvent(new KeyboardEvent('keydown', { key: 'ArrowDown', altKey: true, bubbles: true }));
    await settle();
    expect(profile()).toEqual(['fillet', 'ovolo', 'ovolo', 'fillet']);
  });

  it('marks a zone that belongs to an alternative, so that two wholes do not look like twice the surface', async () => {
    await open();
    const [edge] = store.members();
    const [base] = edge.zones;
    const { id: _id, ...content } = edge;
    store.changeSettings({ alternatives: [{ id: 'oil', name: 'In oil', group: '', note: '', replaces: [base.id] }] });
    const other = { ...base, id: '018f0000-0000-7000-8000-000000000950', alternativeId: 'oil' };
    store.changeMember(ids.edge, { ...content, zones: [base, other] });
    await settle();
    const marks = [...element().querySelectorAll('app-zone-list .item')].map((one) =>
      one.textContent?.includes('in “In oil”'),
    );
    expect(marks).toEqual([false, true]);
  });

  it('asks for parts of a zone that takes parts and has none', async () => {
    await open();
    await show(ids.edge);
    const [edge] = store.members();
    const { id: _id, ...content } = edge;
    const parts = { ...edge.zones[0], take: { way: 'parts' as const, parts: [] } };
    store.changeMember(ids.edge, { ...content, zones: [parts] });
    await settle();
    expect(element().querySelector('app-finding-list')?.textContent).toContain('but none is chosen');
  });

  it('takes a zone by parts of the profile', async () => {
    await open();
    await click('Another shape');
    await click('Moulding');
    const parts = [...element().querySelectorAll<HTMLInputElement>('app-zone-list input[type="radio"]')][1];
    parts.click();
    await settle();
    const ovolo = [...element().querySelectorAll<HTMLInputElement>('app-part-picker input')][1];
    ovolo.click();
    await settle();
    expect(store.members()[0].zones[0].take).toEqual({ way: 'parts', parts: ['ovolo-1'] });
  });

  it('gives a new zone what the others leave', async () => {
    await open();
    await type('Share of the surface', '70');
    await click('Add a zone');
    expect(store.members()[0].zones.map(({ take }) => take)).toEqual([
      { way: 'share', share_percent: 70 },
      { way: 'share', share_percent: 30 },
    ]);
  });

  it('has the first zone take up what is carved already, as high as that is, in one step', async () => {
    const carved = (given: Partial<MemberOrnament>) => ornamentForSpecs({ id: newId(), ...given });
    const ornaments = [
      carved({ ornamentId: 'egg-and-dart', relief: 'low' }),
      carved({ relief: 'high' }),
      // Work done once has no relief of its own.
      carved({ ornamentId: 'clay-model', relief: 'in-the-round' }),
    ];
    server.changeElsewhere(ids.leg, { ornaments });
    await open();
    await show(ids.leg);
    await click('Add a zone');
    const [zone] = store.members()[1].zones;
    expect(zone).toMatchObject({ name: 'All of it', relief: 'high' });
    expect(store.members()[1].ornaments.map(({ zoneId }) => zoneId)).toEqual([zone.id, zone.id, zone.id]);
    store.undo();
    await settle();
    expect(store.members()[1]).toMatchObject({ zones: [], ornaments });
  });

  describe('an ornament along the run', () => {
    const run = (given: Partial<Extract<OrnamentExtent, { way: 'run' }>> = {}): OrnamentExtent => ({
      ...{ way: 'run', run_mm: 1000, runs: 1, mitreLeaf_mm: 0, mitreLeaves: 0, centre_mm: null },
      ...given,
    });
    const lay = (...extents: readonly OrnamentExtent[]) =>
      server.changeElsewhere(ids.edge, {
        ornaments: extents.map((extent) => ornamentForSpecs({ id: newId(), ornamentId: 'egg-and-dart', extent })),
      });
    const runs_mm = () =>
      store.members()[0].ornaments.map(({ extent }) => (extent.way === 'run' ? extent.run_mm : undefined));

    it('follows the run of its member while that is typed, and goes back with it', async () => {
      lay(run(), run({ run_mm: 400 }), run({ runs: 3, mitreLeaf_mm: 40, mitreLeaves: 2 }));
      await open();
      for (const text of ['1', '15', '150', '1500']) await type('Length', text);
      expect(runs_mm()).toEqual([1500, 400, 1500]);
      expect(shape(ids.edge)).toMatchObject({ length_mm: 1500 });
      store.undo();
      await settle();
      expect(runs_mm()).toEqual([1000, 400, 1000]);
      expect(shape(ids.edge)).toMatchObject({ length_mm: 1000 });
    });

    it('stays where mitre leaves leave no room, and where something else was changed', async () => {
      lay(run({ mitreLeaf_mm: 40, mitreLeaves: 2 }));
      await open();
      await type('Length', '70');
      expect(runs_mm()).toEqual([1000]);
      await type('Length', '1000');
      await type('Height', '80');
      expect(runs_mm()).toEqual([1000]);
    });
  });

  it('moves a zone with Alt and the arrows, keeps the new order and takes it back', async () => {
    await open();
    await click('Add a zone');
    await jest.advanceTimersByTimeAsync(3000);
    const names = () => store.members()[0].zones.map(({ name }) => name);
    const fields = () =>
      [
        ...element().querySelectorAll<HTMLInputElement>(
          'app-zone-list input[type="text"], app-zone-list input:not([type])',
        ),
      ]
        .map(({ value }) => value)
        .filter((value) => names().includes(value));
    expect(names()).toEqual(['All of it', 'Zone 2']);
    const first = element().querySelector<HTMLElement>('app-zone-list .item') as HTMLElement;
    first.dispatchEvent(new KeyboardEvent('keydown', { key: 'ArrowDown', altKey: true, bubbles: true }));
    await settle();
    expect([names(), fields()]).toEqual([
      ['Zone 2', 'All of it'],
      ['Zone 2', 'All of it'],
    ]);
    await jest.advanceTimersByTimeAsync(3000);
    expect(server.member(ids.edge)?.zones.map(({ name }) => name)).toEqual(['Zone 2', 'All of it']);
    store.undo();
    await settle();
    expect([names(), fields()]).toEqual([
      ['All of it', 'Zone 2'],
      ['All of it', 'Zone 2'],
    ]);
  });

  it('says beside the sides of a plan that they cannot close it, or by how much they miss', async () => {
    server.members = [
      {
        id: ids.edge,
        version: 1,
        content: {
          ...server.members[0].content,
          shape: {
            ...(shapeDefaults('moulding') as MouldingShape),
            plan: { form: 'polygon', sides_mm: [800, 400, 700, 400], turns_degrees: [90, 90, 90, 90], closed: true },
          },
        },
      },
    ];
    await open();
    const plan = () =>
      element()
        .querySelector('app-plan-editor')
        ?.textContent?.replace(/\u00a0/g, ' ');
    expect(plan()).toContain('the last side ends 100 mm away from where the first one begins');
    const [side] = [...element().querySelectorAll<HTMLInputElement>('app-plan-editor tbody input')];
    side.value = '1600';
    side.dispatchEvent(new Event('input'));
    await settle();
    // 400 + 700 + 400 = 1500.
    expect(plan()).toContain(
      'The side of 1600 mm is too long to close this plan: the others come to 1500 mm together.',
    );
    expect(plan()).not.toContain('the last side ends');
  });

  it('cuts openings out of each', async () => {
    await open();
    await click('Add an opening');
    await type('Diameter', '50');
    await type('How many in each', '4');
    // 4 × π/4 × 5² cm² is 78.5 cm² of 600.
    expect(store.figures()?.members[0].plan_mm2).toBeCloseTo(60_000 - Math.PI * 2500, 6);
  });

  it('asks how a measured area is known', async () => {
    await open();
    await click('Another shape');
    await click('Measured area');
    await type('Area of one', '0.12 m²');
    const note = field('How it was measured');
    expect(note.value).toBe('Guessed by eye, not measured yet');
    note.value = '';
    note.dispatchEvent(new Event('input'));
    await settle();
    expect(complaints()).toEqual(['Please fill this in.']);
    note.value = 'foil pressed on and weighed';
    note.dispatchEvent(new Event('input'));
    await settle();
    expect(shape(ids.edge)).toMatchObject({ kind: 'measured', area_mm2: 120_000 });
  });

  it('chooses timber from the card', async () => {
    await open();
    await choose('Timber', 'Walnut');
    expect(store.members()[0].timberId).toBe('walnut');
  });

  it('shows the bench everything and lets it change nothing', async () => {
    server.isPriced = false;
    await open(['bench']);
    expect(field('Length').disabled).toBe(true);
    expect(button('Another shape')).toBeUndefined();
    expect(element().textContent).not.toContain('€');
  });
});
