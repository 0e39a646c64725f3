import { shopContentSchema } from '#shared/programme/shop-schema';
import { thawedSnapshot } from '../../backend/src/estimates/frozen-snapshot';
import { seededDemonstration, type SeededDemonstration } from './seeded-demonstration';

let seeded: SeededDemonstration;

beforeAll(async () => {
  seeded = await seededDemonstration();
}, 120_000);
afterAll(() => seeded.stop());

async function estimateIds(): Promise<string[]> {
  const rows = await seeded.platform.database.select<{ id: string }>('SELECT id FROM programmes ORDER BY id');
  return rows.map(({ id }) => id);
}

describe('The demonstration', () => {
  it('has three people at the bench, as a person could have entered them, each with work they can do', async () => {
    const { content } = await seeded.app.programme.shops.read(seeded.workshopId);
    expect(shopContentSchema.parse(content)).toEqual(content);
    expect(content.people.map(({ name, membershipId }) => [name, membershipId !== null])).toEqual([
      ['Jonah Pikesley', true],
      ['Tobias Wrenfield', true],
      ['Pelham Rusk', false],
    ]);
  });

  it('has a programme of every job, which holds unless its draft has gone on since', async () => {
    const { programmes } = seeded.app.programme;
    const read = await Promise.all((await estimateIds()).map((id) => programmes.read(seeded.workshopId, id)));
    expect(read.map(({ isCurrent }) => isCurrent).sort()).toEqual([false, true, true]);
    for (const { isCurrent, broken, dates, estimateId } of read) {
      expect(dates && dates.offeredOn > dates.finishesOn).toBe(true);
      expect(broken.length === 0).toBe(isCurrent);
      const { lines } = await seeded.app.estimates.issues.differences(seeded.workshopId, estimateId);
      expect(lines.length === 0).toBe(isCurrent);
    }
  });

  it('shows accepted work and a held offer on the board, nobody promised twice, and a day for the carver', async () => {
    const { board, bench } = seeded.app.programme;
    const shown = await board.read(seeded.workshopId, { weeks: 26 });
    expect(shown.jobs.map(({ standing }) => standing).sort()).toEqual(['accepted', 'held']);
    expect(shown.clashes).toEqual([]);
    const accepted = shown.jobs.find(({ standing }) => standing === 'accepted');
    const carving = accepted?.tasks.find(({ kind }) => kind === 'carving');
    const people = await seeded.app.accounts.people.list(seeded.workshopId);
    const [jonah] = people.filter(({ name }) => name === 'Jonah Pikesley');
    const actor = { ...jonah, membershipId: jonah.id };
    const day = await bench.day(actor, { day: carving?.startsAt.slice(0, 10) });
    expect(day.tasks.map(({ estimateId }) => estimateId)).toContain(accepted?.estimateId);
  });

  it('has its dates in what was issued', async () => {
    for (const id of await estimateIds()) {
      const issues = await seeded.app.estimates.issues.ofEstimate(seeded.workshopId, id);
      const { programme, issuedOn } = thawedSnapshot(issues[issues.length - 1]);
      expect(programme && programme.startsOn >= issuedOn).toBe(true);
      expect(programme?.lots.length).toBeGreaterThan(3);
    }
  });
});
