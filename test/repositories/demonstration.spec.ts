import { gunzipSync } from 'node:zlib';
import { calculatorVersion } from '#shared/estimates/calculator-version';
import { canonicalJson } from '#shared/estimates/canonical-json';
import { memberContentSchema } from '#shared/estimates/member-schema';
import { settingsSchema } from '#shared/estimates/settings-schema';
import { clientContentSchema } from '#shared/jobs/client-schema';
import { thawedSnapshot } from '../../backend/src/estimates/frozen-snapshot';
import type { IssueRow } from '../../backend/src/estimates/issue-model';
import { settingsOfJob, keptMembers } from '../../seeders/demonstration-draft';
import { demonstrationJobs } from '../../seeders/demonstration-jobs';
import { recomputedFigures } from './recomputed-figures';
import { seededDemonstration, type SeededDemonstration } from './seeded-demonstration';

let seeded: SeededDemonstration;

beforeAll(async () => {
  seeded = await seededDemonstration();
}, 120_000);
afterAll(() => seeded.stop());

const titles = ['Pier-table base', 'Cabinet stand', 'Painted plinth'];

async function estimatesInOrder() {
  const { app, workshopId } = seeded;
  const { items } = await app.jobs.service.page(workshopId, { order: 'number', search: '', limit: 50 });
  const jobs = items.toReversed();
  const found = await Promise.all(jobs.map((job) => app.estimates.drafts.ofJob(workshopId, job.id)));
  return found.flat();
}

const issuesOf = async (): Promise<IssueRow[]> => {
  const estimates = await estimatesInOrder();
  const lists = await Promise.all(
    estimates.map((estimate) => seeded.app.estimates.issues.ofEstimate(seeded.workshopId, estimate.id)),
  );
  return lists.flat();
};

describe('The demonstration', () => {
  it('has three jobs in the order they were opened, each with one estimate at issue A', async () => {
    const estimates = await estimatesInOrder();
    expect(estimates.map(({ settings }) => settings.title.split(',')[0]?.split(' under')[0])).toEqual(titles);
    expect(estimates.map(({ letter }) => letter)).toEqual(['A', 'A', 'A']);
  });

  it('has one issue sent, one accepted, and one whose draft has gone on since', async () => {
    expect((await issuesOf()).map(({ state }) => state)).toEqual(['sent', 'accepted', 'issued']);
    const estimates = await estimatesInOrder();
    const changes = await Promise.all(
      estimates.map(({ id }) => seeded.app.estimates.issues.differences(seeded.workshopId, id)),
    );
    expect(changes.map(({ lines }) => lines.length > 0)).toEqual([false, false, true]);
  });

  it('has one decision a client made on their page, and one link that waits with a question nobody has answered', async () => {
    const { app, workshopId } = seeded;
    const jobs = (await estimatesInOrder()).map(({ jobId }) => jobId);
    const { contracts, access, questions } = app.agreements;
    const decided = await Promise.all(jobs.map((jobId) => contracts.decisions(workshopId, jobId)));
    expect(decided.map((of) => of.map(({ kind }) => kind))).toEqual([[], ['accepted'], []]);
    const contract = await contracts.contract(workshopId, jobs[1]);
    expect(contract?.gross_minor).toBe((await issuesOf())[1].grossMinor);
    const given = await Promise.all(jobs.map((jobId) => access.ofJob(workshopId, jobId)));
    expect(given.map((of) => of.filter(({ revokedAt }) => !revokedAt).length)).toEqual([1, 1, 0]);
    const thread = await questions.ofJob(workshopId, jobs[0]);
    expect(thread.map(({ author }) => author)).toEqual(['client', 'workshop', 'client']);
  });

  it('has 12 to 60 members in every job', async () => {
    for (const { members } of await estimatesInOrder()) {
      expect(members).toBeGreaterThanOrEqual(12);
      expect(members).toBeLessThanOrEqual(60);
    }
  });

  it('is put in once', async () => {
    expect(await seeded.seedAgain()).toBe(false);
    expect(await estimatesInOrder()).toHaveLength(3);
  });

  it('says nothing that a person could not have typed', async () => {
    const [estimate] = await estimatesInOrder();
    for (const job of demonstrationJobs()) {
      expect(clientContentSchema.parse(job.client)).toEqual(job.client);
      for (const { content } of keptMembers(job)) expect(memberContentSchema.parse(content)).toEqual(content);
      const settings = estimate && settingsOfJob(job, estimate.settings);
      expect(settingsSchema.parse(settings)).toEqual(settings);
    }
  });
});

describe('The pier-table base of the demonstration', () => {
  /** A moderately ornamented lime base of about 2.15 m² plan and 2.7 m² true; one carver, one gilder, leaf of 80 mm. Common practice, no source. */
  const believable = {
    plan_m2: [2.1, 2.2],
    true_m2: [2.6, 2.85],
    carving_hours: [170, 200],
    gilding_hours: [95, 115],
    gildingWithSetUp_hours: [95, 115],
    booklets: [33, 39],
    weeks: [8, 9],
    net_euros: [21_000, 25_000],
  } as const;

  async function issued(): Promise<Record<keyof typeof believable, number>> {
    const { tally, members, grades, price } = thawedSnapshot((await issuesOf())[0]).figures;
    const gilders = grades.filter(({ gradeId }) => gradeId === 'gilder' || gradeId === 'finisher');
    return {
      plan_m2: members.reduce((sum, { plan_mm2 }) => sum + plan_mm2, 0) / 1e6,
      true_m2: tally.true_mm2 / 1e6,
      carving_hours: tally.carving_hours.likely,
      gilding_hours: tally.handsOn_hours.likely,
      gildingWithSetUp_hours: gilders.reduce((sum, { hours }) => sum + hours, 0),
      booklets: tally.booklets,
      weeks: tally.weeks,
      net_euros: price.net_minor / 100,
    };
  }

  it('comes out as such a base does at the bench', async () => {
    const figures = await issued();
    const outside = Object.entries(believable).filter(([name, [least, most]]) => {
      const figure = figures[name as keyof typeof believable];
      return !(figure > least && figure < most);
    });
    expect(outside).toEqual([]);
  });
});

describe('An issue worked again from what it froze', () => {
  it('gives the figures it was issued with, to the cent', async () => {
    const issues = await issuesOf();
    expect(issues.filter((issue) => issue.calculatorVersion === calculatorVersion)).toHaveLength(3);
    for (const issue of issues) {
      const snapshot = thawedSnapshot(issue);
      const figures = recomputedFigures(snapshot);
      expect(canonicalJson(figures)).toBe(canonicalJson(snapshot.figures));
      const { net_minor, tax_minor, gross_minor } = figures.price;
      expect([net_minor, tax_minor, gross_minor]).toEqual([issue.netMinor, issue.taxMinor, issue.grossMinor]);
    }
  });

  it('gives every alternative the price it was issued with', async () => {
    const snapshots = (await issuesOf()).map(thawedSnapshot);
    expect(snapshots.flatMap(({ alternatives }) => alternatives).length).toBeGreaterThanOrEqual(3);
    for (const snapshot of snapshots)
      for (const { id, gross_minor, difference_minor } of snapshot.alternatives) {
        expect(recomputedFigures({ ...snapshot, choice: [id] }).price.gross_minor).toBe(gross_minor);
        expect(gross_minor - snapshot.figures.price.gross_minor).toBe(difference_minor);
      }
  });
});

describe('A seeded draft worked again', () => {
  it('gives the figures its readers are sent', async () => {
    const { app, platform, workshopId } = seeded;
    for (const { id, rateCardId, currency } of await estimatesInOrder()) {
      const [reading] = await platform.database.select<{ bytes: Buffer }>(
        "SELECT bytes FROM estimate_readings WHERE workshop_id = :workshopId AND id = :id AND audience = 'cost'",
        { workshopId, id },
      );
      const sent = JSON.parse(gunzipSync(reading?.bytes ?? Buffer.alloc(0)).toString('utf8')) as { figures: unknown };
      const draft = app.estimates.drafts.draft(await app.estimates.drafts.whole(workshopId, id));
      const card = await app.rateCards.service.card(workshopId, rateCardId);
      const figures = recomputedFigures({ draft, card, choice: [], workshop: { currency } });
      expect(canonicalJson(figures)).toBe(canonicalJson(sent.figures));
    }
  });
});
