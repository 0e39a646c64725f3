import fc from 'fast-check';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import { estimateWork } from '#shared/estimates/estimate-work';
import type { Member } from '#shared/estimates/member';
import { draftForSpecs, memberForSpecs, ornamentForSpecs, zoneEntryForSpecs } from '#shared/estimates/member-for-specs';
import { programme } from '#shared/programme/programme';
import { millisecondsOf, programmeFrame } from '#shared/programme/programme-frame';
import type { ProgrammeInputs } from '#shared/programme/programme-inputs';
import { programmeOfEstimate, type ProgrammeOfEstimateInput } from '#shared/programme/programme-of-estimate';
import type { Programme } from '#shared/programme/programme-plan';
import type { ProgrammeLag } from '#shared/programme/programme-request';
import { shopOfCard } from '#shared/programme/shop-of-card';
import { verifiedPlan } from '#shared/programme/verified-plan';
import { startCard } from '#shared/rate-cards/start-card';

const hour = 60;
const day = 24 * hour;

const shop = shopOfCard(startCard, () => 'unnamed');
const named = { ...shop, people: shop.people.map((person) => ({ ...person, id: person.gradeIds[0] })) };

interface Asked extends Partial<Omit<ProgrammeOfEstimateInput, 'inputs' | 'frame'>> {
  readonly inputs?: Partial<ProgrammeInputs>;
  readonly from?: string;
  readonly zone?: string;
}

function programmeFor(
  members: readonly Member[],
  { inputs, from = '2026-06-01', zone = 'Europe/Dublin', ...more }: Asked = {},
) {
  const draft = draftForSpecs(members);
  const entered = { direction: 'forward', day: from, climate: null, choice: [], inHand_days: 0 } as const;
  return programmeOfEstimate({
    work: estimateWork(draft, startCard),
    pieces: draft.pieces,
    card: startCard,
    estimateAir: { temperature_celsius: 20, humidity_percent: 50 },
    shop: named,
    inputs: { ...entered, lots: [], hands: [], pins: [], approvals: [], ...inputs },
    marks: [],
    promised: [],
    frame: programmeFrame(from, zone),
    from_minutes: 0,
    ...more,
  });
}

const zoneOf = (id: string, given: Parameters<typeof zoneEntryForSpecs>[0] = {}) => zoneEntryForSpecs({ id, ...given });
const shells = (zoneId: string) =>
  ornamentForSpecs({
    id: `shells ${zoneId}`,
    ornamentId: 'shell',
    relief: 'high',
    zoneId,
    extent: { way: 'pieces', count: 4 },
  });
const panel = memberForSpecs({ zones: [zoneOf('face')], ornaments: [shells('face')] });
const water = 'piece/water-burnished';

const shown = ({ fromTaskId, fromPoint, toTaskId, toPoint, least, most, paceId }: ProgrammeLag) => [
  `${fromTaskId.replace(`${water}/`, '')} ${fromPoint} → ${toTaskId.replace(`${water}/`, '')} ${toPoint}`,
  least,
  most,
  paceId,
];

describe('The programme of an estimate', () => {
  const made = programmeFor([panel]);
  const lags = made.request.lags.map(shown);

  it('has every coat of every step, and the carving by grade that ends in one moment', () => {
    // Four coats on finished carving, as the start card has it.
    const names = made.request.tasks.filter(({ id }) => id.includes('/gesso/')).map(({ name }) => name);
    // A lot without a name is called by its piece and build-up, so that a sentence about its coat says whose coat it is.
    expect(names).toEqual(['1/4', '2/4', '3/4', '4/4'].map((coat) => `Gesso ${coat} (Base: Water gilding, burnished)`));
    const carving = made.items.filter(({ kind }) => kind === 'carving').map(({ gradeId }) => gradeId);
    expect(new Set(carving).size).toBe(carving.length);
    const carvers = made.request.tasks.filter(({ id, crew }) => id.startsWith('member/carv') && crew > 0);
    expect(carvers.length).toBeGreaterThan(0);
    expect(new Set(carvers.map(({ name }) => name)).size).toBe(carvers.length);
    expect(made.request.tasks.find(({ id }) => id === 'member/carved')).toMatchObject({ crew: 0, handsOn_minutes: 0 });
    expect(made.findings).toEqual([]);
  });

  // The figures are those of the start card at 20 °C and 50 % RH: 30 min between coats of gesso and 18 h at the most, all of them within 48 h, a day
  // until it is smoothed; 12 h for the size coat; burnishing ended within a day of the start of laying, whatever the air.
  it.each([
    ['size coat to gesso', 'size-coat/1.1 end → gesso/1.1 start', 12 * hour, null, 'water'],
    ['coat to coat', 'gesso/1.1 end → gesso/1.2 start', 30, 18 * hour, 'water'],
    ['all coats of gesso', 'gesso/1.1 start → gesso/1.4 end', 0, 48 * hour, null],
    ['gesso to smoothing', 'gesso/1.4 end → smooth/1.1 start', day, null, 'water'],
    ['laying to burnishing', 'lay/1.1 start → burnish/1.1 end', 0, day, null],
    ['carving to size coat', 'member/carved end → size-coat/1.1 start', 0, null, null],
  ])('keeps %s', (_, between, least, most, paceId) => {
    expect(lags).toContainEqual([between, least, most, paceId]);
  });

  it('waits for carving approved, top fitted and sample, each before its step', () => {
    const waits = made.approvals.map(({ hold, afterTaskId, beforeTaskId, name }) => [
      hold,
      name,
      afterTaskId,
      beforeTaskId,
    ]);
    expect(waits).toEqual([
      ['carving-approved', 'Panel', 'member/carved', `${water}/size-coat/1.1`],
      ['top-dry-fitted', 'Base', 'member/carved', `${water}/size-coat/1.1`],
      ['sample-approved', 'Water gilding, burnished', null, `${water}/yellow-bole/1.1`],
    ]);
  });

  it('has the hours of the estimate, rounded up to the minute for each task and no more', () => {
    const work = estimateWork(draftForSpecs([panel]), startCard);
    const estimated = work.labour.reduce((sum, { hours }) => sum + hours, 0) * 60;
    const planned = made.items.reduce((sum, { handsOn_minutes }) => sum + handsOn_minutes, 0);
    expect(planned).toBeGreaterThanOrEqual(Math.floor(estimated));
    expect(planned).toBeLessThan(estimated + made.items.length);
  });

  it('counts recutting as a step of its lot and not as carving', () => {
    const recut = programmeFor([
      memberForSpecs({ zones: [zoneOf('face', { recutting: 'plain' })], ornaments: [shells('face')] }),
    ]);
    const carvingOf = (one: typeof made) =>
      one.items
        .filter(({ kind }) => kind === 'carving')
        .map(({ gradeId, handsOn_minutes }) => [gradeId, handsOn_minutes]);
    expect(carvingOf(recut)).toEqual(carvingOf(made));
    expect(recut.items.find(({ kind }) => kind === 'recut')?.handsOn_minutes).toBeGreaterThan(0);
  });
});

describe('Leaf laid on size', () => {
  const large = memberForSpecs({
    shape: { kind: 'rectangle', length_mm: 2500, height_mm: 1200 },
    zones: [zoneOf('face', { buildUpId: 'oil-quick' })],
  });
  const made = programmeFor([large]);
  const sizes = made.items.filter(({ kind }) => kind === 'oil-size');

  it('has to be all laid while the size takes it: 2 h of tack and 2 h of window, in portions where that is too little', () => {
    expect(sizes.length).toBeGreaterThan(1);
    for (const { portion } of sizes) {
      const [size, lay] = ['size', 'lay'].map((step) => `piece/oil-quick/${step}/${String(portion)}.1`);
      const own = made.request.lags.filter((lag) => lag.fromTaskId === size && lag.toTaskId === lay);
      expect(own.map(({ toPoint, least, most, paceId }) => [toPoint, least, most, paceId])).toEqual([
        ['start', 2 * hour, null, 'oil'],
        ['end', 0, 4 * hour, 'oil'],
      ]);
    }
    const laying = made.request.tasks.filter(({ id }) => id.includes('/lay/'));
    expect(laying.every(({ isBreakable }) => !isBreakable)).toBe(true);
    expect(made.findings).toContainEqual(expect.objectContaining({ code: 'programme-in-portions' }));
  });

  it('might be laid on another size of the card, each once, with its own tack and window', () => {
    const [portion] = sizes;
    const at = (name: string) =>
      made.otherSizes
        .find((size) => size.name === name)
        ?.lags.filter(({ fromTaskId }) => fromTaskId === portion.taskId)
        .map(({ toPoint, least, most, paceId }) => [toPoint, least, most, paceId]);
    expect(made.otherSizes.map(({ name }) => name)).toEqual([
      '3-hour oil size',
      '12-hour oil size',
      'Water-borne size',
    ]);
    expect(at('12-hour oil size')).toEqual([
      ['start', 12 * hour, null, 'oil'],
      ['end', 0, 22 * hour, 'oil'],
    ]);
    expect(at('Water-borne size')?.[0]).toEqual(['start', 20, null, 'water']);
    const ids = new Set(made.request.lags.map(({ id }) => id));
    expect(made.otherSizes.flatMap(({ lags }) => lags).every(({ id }) => ids.has(id))).toBe(true);
    expect(programmeFor([panel]).otherSizes).toEqual([]);
  });

  it('is worked in as many portions, by as many hands, as somebody says', () => {
    const lots = [{ lotId: 'piece/oil-quick', portions: 9, crew: 2, mostPeople: 3, places: null }];
    const asked = programmeFor([large], { inputs: { lots } });
    expect(asked.items.filter(({ kind }) => kind === 'oil-size')).toHaveLength(9);
    expect(asked.request.tasks.find(({ id }) => id.includes('/lay/'))).toMatchObject({ crew: 2, mostPeople: 3 });
    expect(asked.findings.map(({ code }) => code)).toContain('programme-crew-short');
  });

  it('comes to a member when all gilding in water on it is done, and to another when it likes', () => {
    const share = (share_percent: number) => ({ take: { way: 'share' as const, share_percent } });
    const both = memberForSpecs({
      zones: [zoneOf('a', share(50)), zoneOf('b', { buildUpId: 'oil-3-hour', ...share(50) })],
    });
    const apart = [
      memberForSpecs({ zones: [zoneOf('a')] }),
      memberForSpecs({ id: 'other', zones: [zoneOf('b', { buildUpId: 'oil-3-hour' })] }),
    ];
    const between = (members: readonly Member[]) =>
      programmeFor(members)
        .request.lags.filter(({ id }) => id.endsWith(':water-first'))
        .map(({ fromTaskId, toTaskId }) => [fromTaskId, toTaskId]);
    expect(between([both])).toEqual([[`${water}/protect-edge/1.1`, 'piece/oil-3-hour/size/1.1']]);
    expect(between(apart)).toEqual([]);
  });
});

describe('The air of a programme', () => {
  const stretches = (model: string, asked: Asked) =>
    programmeFor([panel], asked).request.paces.find(({ id }) => id === model)?.stretches ?? [];

  it('given throughout slows oil by a doubling for ten degrees', () => {
    const inputs = { climate: { temperature_celsius: 10, humidity_percent: 50 } };
    expect(stretches('oil', { inputs })).toEqual([{ from_minutes: 0, factor: 2 }]);
  });

  it('follows the months of the workshop from the first of each, by the clock on its wall', () => {
    const climates = Array.from({ length: 12 }, (_, month) => ({
      temperature_celsius: month < 3 ? 10 : 20,
      humidity_percent: 50,
    }));
    const [first, second] = stretches('oil', { from: '2026-03-20', shop: { ...named, climates } });
    // From 20 March to 1 April are 12 days, and on the 29th the clocks of Dublin go forward.
    expect([first, second]).toEqual([
      { from_minutes: 0, factor: 2 },
      { from_minutes: 12 * day - hour, factor: 1 },
    ]);
  });

  it('in which nothing dries is refused throughout, and in a month of it stops the drying', () => {
    const freezing = { temperature_celsius: 2, humidity_percent: 60 };
    expect(programmeFor([panel], { inputs: { climate: freezing } }).findings).toMatchObject([
      { kind: 'refuse', code: 'drying-too-cold' },
    ]);
    const mild = { temperature_celsius: 18, humidity_percent: 50 };
    const climates = [freezing, ...Array.from({ length: 11 }, () => mild)];
    const made = programmeFor([panel], { from: '2027-01-04', shop: { ...named, climates } });
    expect(made.findings).toMatchObject([{ kind: 'warn', code: 'drying-too-cold' }]);
    const plan = programme(made.request, { limit: { nodes: 1 } });
    const gesso = plan.tasks.find(({ taskId }) => taskId.endsWith('gesso/1.1'));
    expect(
      dayOfInstant(
        millisecondsOf(gesso?.start_minutes ?? 0, programmeFrame('2027-01-04', 'Europe/Dublin')),
        'Europe/Dublin',
      ) >= '2027-02-01',
    ).toBe(true);
  });
});

describe('What has happened', () => {
  it('stays where it was, and what somebody pinned where they put it', () => {
    const marks = [
      {
        taskId: 'member/carving/carver',
        startedAt: '2026-06-01T07:00:00.000Z',
        endedAt: '2026-06-02T09:30:00.000Z',
        left_minutes: 0,
        leftAt: '2026-06-01T07:00:00.000Z',
        personIds: ['carver'],
      },
    ];
    const pins = [{ taskId: `${water}/burnish/1.1`, at: '2026-07-06T08:00:00.000Z' }];
    const { tasks } = programmeFor([panel], { marks, inputs: { pins } }).request;
    // Dublin is an hour ahead of UTC in June: 07:00 UTC is 08:00, the 480th minute.
    expect(tasks.find(({ id }) => id === 'member/carving/carver')?.happened).toEqual({
      ...{ start_minutes: 480, end_minutes: day + 630, left_minutes: 0, leftAt_minutes: 480, personIds: ['carver'] },
    });
    expect(tasks.find(({ id }) => id.endsWith('burnish/1.1'))?.pinned_minutes).toBe(35 * day + 540);
  });

  it('carries the end of a member’s carving with it, from which its approval is waited for and not from today', () => {
    const carving = programmeFor([panel]).items.filter(({ kind }) => kind === 'carving');
    const marks = carving.map(({ taskId, gradeId }, at) => ({
      ...{ taskId, startedAt: '2026-06-01T07:00:00.000Z', left_minutes: 0, personIds: [gradeId] },
      leftAt: '2026-06-01T07:00:00.000Z',
      endedAt: `2026-06-0${String(2 + at)}T09:30:00.000Z`,
    }));
    // A fortnight later: two working days after the last of the carving are long over, and so is the fitting of the top.
    const { request } = programmeFor([panel], { marks, from_minutes: 14 * day + 8 * hour });
    const ended = (1 + (carving.length - 1)) * day + 630;
    expect(request.tasks.find(({ id }) => id === 'member/carved')?.happened).toEqual({
      ...{ start_minutes: ended, end_minutes: ended, left_minutes: 0, leftAt_minutes: ended, personIds: [] },
    });
    const plan = programme(request, { limit: { nodes: 1 } });
    expect(plan.tasks.find(({ taskId }) => taskId === `${water}/size-coat/1.1`)?.start_minutes).toBe(
      14 * day + 8 * hour,
    );
  });

  it('keeps others from the people and places that are promised elsewhere', () => {
    const places = [{ id: 'rack', name: 'Rack', kind: 'rack' as const, capacity: 2 }];
    const span = { start_minutes: 480, end_minutes: 900 };
    const promised = [
      {
        estimateId: 'other',
        people: [{ ...span, personId: 'gilder' }],
        places: [{ ...span, placeId: 'rack', amount: 1 }],
      },
    ];
    const {
      people,
      places: rooms,
      placeHolds,
    } = programmeFor([panel], { shop: { ...named, places }, promised }).request;
    expect(people.find(({ id }) => id === 'gilder')?.away).toEqual([span]);
    expect(rooms[0].taken).toEqual([{ ...span, amount: 1 }]);
    expect(placeHolds).toEqual([
      {
        placeId: 'rack',
        amount: 1,
        fromTaskId: `${water}/size-coat/1.1`,
        untilTaskId: expect.stringMatching(/1\.1$/) as string,
      },
    ]);
  });

  it('gives whatever is carved a bench while it is carved, and takes places of a kind together', () => {
    const places = [
      { id: 'bench', name: 'Bench', kind: 'bench' as const, capacity: 1 },
      { id: 'long', name: 'Long rack', kind: 'rack' as const, capacity: 2 },
      { id: 'short', name: 'Short rack', kind: 'rack' as const, capacity: 3 },
    ];
    const span = { start_minutes: 480, end_minutes: 900 };
    const promised = [{ estimateId: 'other', people: [], places: [{ ...span, placeId: 'short', amount: 2 }] }];
    const { request } = programmeFor([panel], { shop: { ...named, places }, promised });
    expect(request.places).toEqual([
      { id: 'long', name: 'Long rack, Short rack', capacity: 5, taken: [{ ...span, amount: 2 }] },
      { id: 'bench', name: 'Bench', capacity: 1, taken: [] },
    ]);
    const carved = request.tasks.filter(({ id }) => id.includes('/carving/')).map(({ id }) => id);
    expect(carved.length).toBeGreaterThan(0);
    expect(request.placeHolds.filter(({ placeId }) => placeId === 'bench')).toEqual(
      carved.map((id) => ({ placeId: 'bench', amount: 1, fromTaskId: id, untilTaskId: id })),
    );
  });
});

/** The day and the time by the clock on the wall of a zone, as the machine's own calendar has them. */
function wallClock(instant_ms: number, timeZone: string) {
  const text = new Intl.DateTimeFormat('sv-SE', { timeZone, dateStyle: 'short', timeStyle: 'short' }).format(
    instant_ms,
  );
  return { day: text.slice(0, 10), time: text.slice(11) };
}

describe('Planned in the workshop’s own time', () => {
  const closed = { id: 'closed', name: 'Between the years', firstDay: '2026-12-24', lastDay: '2027-01-03', hours: [] };
  const winter = { ...named, days: [closed] };

  it.each([
    ['over the change of the clocks in spring', '2026-03-26', 'Europe/Dublin'],
    ['over the change of the clocks in autumn', '2026-10-22', 'Europe/Vienna'],
    ['over the change of the clocks in New York', '2026-10-29', 'America/New_York'],
    ['over a leap day', '2028-02-24', 'Europe/Dublin'],
    ['over the year’s end, while it is closed', '2026-12-17', 'Pacific/Auckland'],
  ])('%s all work lies in working hours, and every rule is kept', (_, from, zone) => {
    const made = programmeFor([panel], { from, zone, shop: winter });
    const plan = programme(made.request, { limit: { nodes: 2 } });
    expect(verifiedPlan(plan, made.request).broken).toEqual([]);
    const frame = programmeFrame(from, zone);
    const spans = plan.tasks.filter(({ personIds }) => personIds.length > 0).flatMap((task) => task.spans);
    expect(spans.length).toBeGreaterThan(20);
    for (const { start_minutes, end_minutes } of spans) {
      const [start, end] = [start_minutes, end_minutes].map((minutes) =>
        wallClock(millisecondsOf(minutes, frame), zone),
      );
      expect(start.day).toBe(end.day);
      expect(start.time >= '08:00' && end.time <= '17:00').toBe(true);
      expect(start.day < closed.firstDay || start.day > closed.lastDay).toBe(true);
    }
    const days = new Set(spans.map(({ start_minutes }) => wallClock(millisecondsOf(start_minutes, frame), zone).day));
    if (from.startsWith('2028')) expect([...days]).toContain('2028-02-29');
  });

  it('never finishes sooner in colder air', () => {
    fc.assert(
      fc.property(fc.integer({ min: 10, max: 25 }), fc.integer({ min: 0, max: 10 }), (warm, by) => {
        const planAt = (temperature_celsius: number, incumbent?: Programme) => {
          const { request } = programmeFor([panel], {
            inputs: { climate: { temperature_celsius, humidity_percent: 50 } },
          });
          return programme(request, { limit: { nodes: 1 }, incumbent });
        };
        const cold = planAt(Math.max(6, warm - by));
        expect(cold.finish_minutes).not.toBeNull();
        expect(planAt(warm, cold).finish_minutes).toBeLessThanOrEqual(cold.finish_minutes ?? 0);
      }),
      { numRuns: 8 },
    );
  });
});
