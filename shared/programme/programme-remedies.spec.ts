import { inPortions } from '#shared/programme/in-portions';
import { programme } from '#shared/programme/programme';
import { programmeRemedies } from '#shared/programme/programme-remedies';
import { lagForSpecs, personForSpecs, requestForSpecs, taskForSpecs } from '#shared/programme/request-for-specs';

/** A three-hour size whose laying has to end four hours after the tack, and four and a half hours of laying. */
const request = requestForSpecs({
  tasks: [
    taskForSpecs('size', { handsOn_minutes: 120, isBreakable: false }),
    taskForSpecs('lay', { handsOn_minutes: 270, isBreakable: false, mostPeople: 2 }),
    taskForSpecs('tone'),
  ],
  lags: [
    lagForSpecs('size', 'lay', { least: 180 }),
    lagForSpecs('size', 'lay', { id: 'window', toPoint: 'end', most: 420 }),
    lagForSpecs('lay', 'tone', { least: 60 }),
  ],
});

const slowSize = {
  name: 'Twelve-hour size',
  lags: [
    lagForSpecs('size', 'lay', { least: 720 }),
    lagForSpecs('size', 'lay', { id: 'window', toPoint: 'end', most: 1440 }),
  ],
};

describe('What helps a size that finds no time', () => {
  const plan = programme(request);
  const remedies = programmeRemedies(request, 'size', { otherSizes: [slowSize] });
  const finishes = new Map(remedies.map(({ code, plan: { finish_minutes } }) => [code, finish_minutes]));

  it('is asked only where there is none', () => {
    expect(plan).toMatchObject({
      status: 'infeasible',
      findings: [{ code: 'programme-contradiction', values: { over_minutes: 30 } }],
    });
  });

  it('is each tried by planning anew, soonest first', () => {
    // With two: size from 8 to 10, laid from 13:00 to 15:15, toned from 16:15, the last quarter of an hour the next morning. Slow size: from 15 to 17, laid
    // the next day from 8:00 to 13:30, toned from 14:30. In halves: one each day, the second laid from 13:00 to 15:15 and toned as above. However long the
    // day, four and a half hours do not go into four.
    expect([...finishes]).toEqual([
      ['programme-remedy-further-hands', 1440 + 8 * 60 + 15],
      ['programme-remedy-other-size', 1440 + 15 * 60 + 30],
      ['programme-remedy-portions', 2 * 1440 + 8 * 60 + 15],
      ['programme-remedy-longer-day', null],
    ]);
    const ends = remedies.map(({ plan: { finish_minutes } }) => finish_minutes ?? Infinity);
    expect(ends).toEqual([...ends].sort((a, b) => a - b));
  });

  it('in portions is tried in so many as it takes', () => {
    // Eighteen hours of laying into a window of four: in four it is four and a half hours each, in five a little more than three and a half.
    const lay = taskForSpecs('lay', { handsOn_minutes: 18 * 60, isBreakable: false });
    const large = { ...request, tasks: [request.tasks[0], lay, request.tasks[2]] };
    const helping = programmeRemedies(large, 'size', { otherSizes: [] }).filter(
      ({ plan: { finish_minutes } }) => finish_minutes !== null,
    );
    expect(helping.map(({ code, values }) => [code, values['portions']])).toEqual([['programme-remedy-portions', 5]]);
  });

  it('in portions keeps all the work', () => {
    const halves = inPortions(request, 'size', 2);
    expect(halves.tasks.map(({ id, handsOn_minutes }) => [id, handsOn_minutes])).toEqual([
      ['size#1', 60],
      ['size#2', 60],
      ['lay#1', 135],
      ['lay#2', 135],
      ['tone', 60],
    ]);
    expect(halves.lags.map(({ fromTaskId, toTaskId }) => `${fromTaskId} ${toTaskId}`)).toEqual([
      'size#1 lay#1',
      'size#2 lay#2',
      'size#1 lay#1',
      'size#2 lay#2',
      'lay#1 tone',
      'lay#2 tone',
    ]);
  });
});

describe('What helps where all of it comes too late', () => {
  const late = requestForSpecs({
    tasks: ['one', 'two'].map((id) => taskForSpecs(id, { handsOn_minutes: 300, mostPeople: 1 })),
    people: [personForSpecs('gina', 'gilder')],
  });
  // Ten hours of work for one person, wanted in a day of eight.
  const search = { backwardFrom_minutes: 17 * 60, limit: { nodes: 5 } };

  it('is more hands or a longer day, each tried by the day wanted', () => {
    expect(programme(late, search).findings).toMatchObject([{ code: 'programme-too-late' }]);
    const remedies = programmeRemedies(late, null, { otherSizes: [], search });
    // A day longer at its end is none before five, so only a second gilder helps: five hours each.
    expect(remedies.map(({ code, plan }) => [code, plan.finish_minutes])).toEqual([
      ['programme-remedy-further-hands', 17 * 60],
      ['programme-remedy-longer-day', null],
    ]);
    const later = { ...search, backwardFrom_minutes: 24 * 60 };
    const evening = programmeRemedies(late, null, { otherSizes: [], search: later });
    expect(evening.map(({ code, values }) => [code, values['by_minutes'] ?? null])).toContainEqual([
      'programme-remedy-longer-day',
      120,
    ]);
  });
});
