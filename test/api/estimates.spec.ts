import { randomUUID } from 'node:crypto';
import type { Response } from 'supertest';
import { v7 as newId } from 'uuid';
import { changeEstimate, readAlternatives, readEstimate } from '#shared/estimates/estimates-endpoints';
import { issueEstimate, listIssues, markIssue, readIssue, readPaper } from '#shared/estimates/issues-endpoints';
import type { Change } from '#shared/estimates/change-schema';
import type { AlternativeTotal } from '#shared/estimates/alternative-total';
import type { CostedEstimate } from '#shared/estimates/estimate-schema';
import { listHistory } from '#shared/audit/history-endpoints';
import { removeJob } from '#shared/jobs/jobs-endpoints';
import { startApi, type Api } from './start-api';
import { sampleEstimate, sampleMember, type SampleEstimate } from './sample-estimate';

/** A body as it came, whatever its media type. */
const binary = (response: Response, done: (error: Error | null, body: Buffer) => void): void => {
  const parts: Buffer[] = [];
  response.on('data', (part: Buffer) => parts.push(part));
  response.on('end', () => done(null, Buffer.concat(parts)));
};

let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterAll(() => api.stop());

const keep = (estimateId: string, changes: readonly Change[]) =>
  api.as('estimator').call(changeEstimate, { params: { estimateId }, body: { changes } });

const read = (role: 'owner' | 'office' | 'bench', estimateId: string) =>
  api.as(role).call(readEstimate, { params: { estimateId } });

async function versionOf(estimateId: string): Promise<number> {
  return (await api.app.estimates.drafts.whole(api.ours.id, estimateId)).estimate.version;
}

async function issue(sample: SampleEstimate, key = randomUUID(), version?: number) {
  const { estimateId } = sample;
  const body = { version: version ?? (await versionOf(estimateId)), note: '', acceptsOldCard: false };
  return api.as('estimator').call(issueEstimate, { params: { estimateId }, body, key });
}

const named = (sample: SampleEstimate, name: string, version: number): Change => ({
  kind: 'member',
  id: sample.memberId,
  version,
  content: { ...sample.member, name },
});

/** Every key and text of an answer, however deep. */
function keysOf(value: unknown): string[] {
  if (Array.isArray(value)) return value.flatMap(keysOf);
  if (value === null || typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([key, inner]) => [key, ...keysOf(inner)]);
}

describe('keeping a draft', () => {
  it('answers the figures of record and the versions of what was kept', async () => {
    const sample = await sampleEstimate(api.ours);
    const response = await keep(sample.estimateId, [named(sample, 'Rail', 1)]);
    const body = response.body as { version: number; versions: unknown; figures: { tally: { members: number } } };
    expect(response.status).toBe(200);
    expect(body.versions).toEqual([{ id: sample.memberId, version: 2 }]);
    expect(body.figures.tally.members).toBe(2);
    const stored = (await read('owner', sample.estimateId)).body as { version: number; figures: unknown };
    expect(stored.version).toBe(body.version);
    expect(stored.figures).toEqual(body.figures);
  });

  it('refuses in words what comes to more than is worked, and keeps nothing of it', async () => {
    const sample = await sampleEstimate(api.ours);
    const shape = { kind: 'rectangle', length_mm: 90_000, height_mm: 9_000 } as const;
    const large = { ...sample.member, count: 10_000, shape, ornaments: [] };
    const refused = await keep(sample.estimateId, [
      { kind: 'member', id: sample.memberId, version: 1, content: large },
    ]);
    expect([refused.status, (refused.body as { type: string }).type]).toEqual([422, 'urn:problem:estimate-too-large']);
    const stored = (await read('owner', sample.estimateId)).body as CostedEstimate;
    expect(stored.members.map(({ version, content }) => [version, content.count])).toEqual([[1, 2]]);
  });

  it('tells the second of two people, and shows both sides', async () => {
    const sample = await sampleEstimate(api.ours);
    await keep(sample.estimateId, [named(sample, 'First', 1)]);
    const late = await keep(sample.estimateId, [named(sample, 'Second', 1)]);
    expect(late.status).toBe(412);
    const { current } = late.body as { current: { version: number; content: { name: string } } };
    expect(current.version).toBe(2);
    expect(current.content.name).toBe('First');
  });

  it('finds a request that was sent twice done already', async () => {
    const sample = await sampleEstimate(api.ours);
    const first = await keep(sample.estimateId, [named(sample, 'Once', 1)]);
    const again = await keep(sample.estimateId, [named(sample, 'Once', 1)]);
    expect(again.status).toBe(200);
    expect((again.body as { version: number }).version).toBe((first.body as { version: number }).version);
  });

  it('keeps all changes of a list or none', async () => {
    const sample = await sampleEstimate(api.ours);
    const before = (await read('owner', sample.estimateId)).text;
    const stale: Change = { kind: 'piece', id: sample.pieceId, version: 7, content: { name: 'x', place: 1, note: '' } };
    expect((await keep(sample.estimateId, [named(sample, 'Never', 1), stale])).status).toBe(412);
    expect((await read('owner', sample.estimateId)).text).toBe(before);
  });

  it('refuses a member whose piece stands in another estimate, and a piece that still has members', async () => {
    const [sample, other] = [await sampleEstimate(api.ours), await sampleEstimate(api.ours)];
    const moved: Change = { ...named(sample, 'x', 1), content: { ...sample.member, pieceId: other.pieceId } } as Change;
    const response = await keep(sample.estimateId, [moved]);
    expect(response.status).toBe(400);
    expect((response.body as { errors: { path: unknown }[] }).errors[0]?.path).toEqual([
      'body',
      'changes',
      0,
      'content',
      'pieceId',
    ]);
    const gone: Change = { kind: 'piece', id: sample.pieceId, version: 1, content: null };
    expect((await keep(sample.estimateId, [gone])).status).toBe(400);
  });

  it('does not let an estimate take or change another estimate’s member', async () => {
    const [sample, other] = [await sampleEstimate(api.ours), await sampleEstimate(api.ours)];
    const stolen: Change = {
      kind: 'member',
      id: other.memberId,
      version: 1,
      content: { ...sample.member, name: 'Stolen' },
    };
    const response = await keep(sample.estimateId, [stolen]);
    expect([400, 404, 409, 412]).toContain(response.status);
    const theirs = (await read('owner', other.estimateId)).body as { members: { content: { name: string } }[] };
    expect(theirs.members.map((member) => member.content.name)).toEqual([other.member.name]);
  });

  it('removes a piece with its members, and undoes it by the inverse change', async () => {
    const sample = await sampleEstimate(api.ours);
    const gone: Change[] = [
      { kind: 'piece', id: sample.pieceId, version: 1, content: null },
      { kind: 'member', id: sample.memberId, version: 1, content: null },
    ];
    expect((await keep(sample.estimateId, gone)).status).toBe(200);
    const back: Change[] = [
      { kind: 'member', id: sample.memberId, version: 0, content: sample.member },
      { kind: 'piece', id: sample.pieceId, version: 0, content: { name: 'Back', place: 1, note: '' } },
    ];
    const response = await keep(sample.estimateId, back);
    expect(response.status).toBe(200);
    expect((response.body as { figures: { members: unknown[] } }).figures.members).toHaveLength(1);
  });

  it('writes one entry of history for one person’s saves of one member within ten minutes', async () => {
    const sample = await sampleEstimate(api.ours);
    for (const [name, version] of [
      ['A', 1],
      ['B', 2],
      ['C', 3],
    ] as const)
      await keep(sample.estimateId, [named(sample, name, version)]);
    const history = await api.as('owner').call(listHistory, { query: { jobId: sample.jobId, limit: 50 } });
    const entries = (history.body as { items: { code: string; values: { name: string } }[] }).items;
    const changed = entries.filter((entry) => entry.code === 'history-member-changed');
    expect(changed.map((entry) => entry.values.name)).toEqual(['C']);
  });

  it('tells in the history which fields changed, and those without cost nothing of money', async () => {
    const sample = await sampleEstimate(api.ours);
    await keep(sample.estimateId, [named(sample, 'Renamed', 1)]);
    const { settings, settingsVersion } = (await read('owner', sample.estimateId)).body as CostedEstimate;
    const profit = { way: 'margin', percent: '31' } as const;
    await keep(sample.estimateId, [
      { kind: 'settings', id: sample.estimateId, version: settingsVersion, content: { ...settings, profit } },
    ]);
    const changesOf = async (role: 'owner' | 'office', code: string) => {
      const history = await api.as(role).call(listHistory, { query: { jobId: sample.jobId, limit: 50 } });
      const { items } = history.body as { items: { code: string; changes: { path: string[]; after: unknown }[] }[] };
      return items.filter((item) => item.code === code).flatMap(({ changes }) => changes);
    };
    const renamed = [{ path: ['name'], what: 'changed', before: sample.member.name, after: 'Renamed' }];
    expect(await changesOf('owner', 'history-member-changed')).toEqual(renamed);
    expect(await changesOf('office', 'history-member-changed')).toEqual(renamed);
    const margin = (await changesOf('owner', 'history-settings-changed')).find(
      ({ path }) => path.join() === 'profit,percent',
    );
    expect(margin?.after).toBe('31');
    expect(await changesOf('office', 'history-settings-changed')).toEqual([]);
  });

  it('reads an estimate in a number of queries that does not grow with its members', async () => {
    const [small, large] = [await sampleEstimate(api.ours), await sampleEstimate(api.ours)];
    const more = Array.from({ length: 30 }, (_, index): Change => ({
      kind: 'member',
      id: newId(),
      version: 0,
      content: sampleMember(large.pieceId, `Member ${index}`),
    }));
    expect((await keep(large.estimateId, more)).status).toBe(200);
    const queries = async (estimateId: string) => {
      const before = api.platform.database.statements;
      await read('owner', estimateId);
      return api.platform.database.statements - before;
    };
    const few = await queries(small.estimateId);
    expect(await queries(large.estimateId)).toBe(few);
    expect(few).toBeLessThan(12);
  });
});

describe('what each role is shown', () => {
  it('gives the bench no price, rate, margin or cost, in any field', async () => {
    const { estimateId } = await sampleEstimate(api.ours);
    const keys = keysOf((await read('bench', estimateId)).body);
    const carving = new Set(['stages']);
    const money = /minor|price|cost|margin|markUp|profit|discount|contingency|extras|stages/i;
    expect(keys.filter((key) => money.test(key) && !carving.has(key))).toEqual([]);
    expect(keys).toContain('grossLeaves');
  });

  it('gives the office prices without cost', async () => {
    const { estimateId } = await sampleEstimate(api.ours);
    const keys = keysOf((await read('office', estimateId)).body);
    expect(keys).toContain('gross_minor');
    expect(keys.filter((key) => /cost|margin|markUp|profit|contingency|overhead|direct/i.test(key))).toEqual([]);
  });
});

describe('the totals of alternatives', () => {
  it('are shown to the office and those who see cost, as an issue would freeze them, and not to the bench', async () => {
    const sample = await sampleEstimate(api.ours);
    const { estimateId } = sample;
    const { settings, settingsVersion } = (await read('owner', estimateId)).body as CostedEstimate;
    const id = newId();
    const line = { id: newId(), kind: 'price' as const, name: 'A crate', price: '250.00' };
    const extra = { ...line, memberId: null, taxCategoryId: settings.taxCategoryId, alternativeId: id };
    const alternative = { id, name: 'In a crate', group: '', note: '', replaces: [] };
    const content = { ...settings, alternatives: [alternative], extras: [extra] };
    await keep(estimateId, [{ kind: 'settings', id: estimateId, version: settingsVersion, content }]);
    const ask = (role: 'owner' | 'office' | 'bench') => api.as(role).call(readAlternatives, { params: { estimateId } });
    const { items } = (await ask('office')).body as { items: AlternativeTotal[] };
    // 250.00 at 20 %, in whole cents; the lines of the base stay as they are.
    expect(items).toMatchObject([{ id, difference_minor: 300_00 }]);
    const { figures } = (await read('owner', estimateId)).body as CostedEstimate;
    const { booklets, carving_hours, handsOn_hours, workingDays, weeks } = figures.tally;
    expect(items[0].gross_minor).toBe(figures.price.gross_minor + 300_00);
    // A crate needs no leaf, no carving and no coat.
    const hours = carving_hours.likely + handsOn_hours.likely;
    expect(items[0].tally).toEqual({ booklets, hours, workingDays, weeks });
    expect((await ask('owner')).body).toEqual({ items });
    expect((await ask('bench')).status).toBe(403);
    const issued = (await issue(sample)).body as { id: string };
    const frozen = (await api.as('office').call(readIssue, { params: { issueId: issued.id } })).body as object;
    expect(frozen).toMatchObject({ alternatives: items });
  });
});

describe('issuing', () => {
  it('freezes A, then B, and shows line by line what B changes', async () => {
    const sample = await sampleEstimate(api.ours);
    const first = await issue(sample);
    expect(first.body).toMatchObject({ letter: 'A', state: 'issued' });
    await keep(sample.estimateId, [
      { ...named(sample, 'Frieze', 1), content: { ...sample.member, count: 3 } } as Change,
    ]);
    const second = await issue(sample);
    expect(second.body).toMatchObject({ letter: 'B' });
    const { id } = second.body as { id: string };
    const frozen = (await api.as('owner').call(readIssue, { params: { issueId: id } })).body as {
      differences: { before_minor: number; after_minor: number }[];
    };
    expect(frozen.differences.length).toBeGreaterThan(0);
    for (const line of frozen.differences) expect(line.after_minor).toBeGreaterThan(line.before_minor);
    const list = (await api.as('office').call(listIssues, { params: { estimateId: sample.estimateId } })).body as {
      items: { letter: string; state: string }[];
    };
    expect(list.items.map(({ letter, state }) => `${letter} ${state}`)).toEqual(['B issued', 'A replaced']);
  });

  it('answers the same key with the same issue, and refuses it with another body', async () => {
    const sample = await sampleEstimate(api.ours);
    const key = randomUUID();
    const version = await versionOf(sample.estimateId);
    const first = await issue(sample, key, version);
    const again = await issue(sample, key, version);
    expect(again.body).toEqual(first.body);
    expect((await issue(sample, key, version + 1)).status).toBe(422);
  });

  it('lets exactly one of fifty that were pressed at once succeed', async () => {
    const sample = await sampleEstimate(api.ours);
    const version = await versionOf(sample.estimateId);
    const responses = await Promise.all(Array.from({ length: 50 }, () => issue(sample, randomUUID(), version)));
    expect(responses.filter((response) => response.status === 200)).toHaveLength(1);
    expect(await api.app.estimates.issues.ofEstimate(api.ours.id, sample.estimateId)).toHaveLength(1);
  }, 60_000);

  it('is refused where a trade rule forbids it, in words', async () => {
    const sample = await sampleEstimate(api.ours);
    const [zone] = sample.member.zones;
    const composition = { ...zone, leafId: 'composition-loose' };
    await keep(sample.estimateId, [
      { ...named(sample, 'Frieze', 1), content: { ...sample.member, zones: [composition] } } as Change,
    ]);
    const response = await issue(sample);
    expect(response.status).toBe(409);
    expect((response.body as { errors: unknown[] }).errors.length).toBeGreaterThan(0);
  });

  it('cannot be changed afterwards, not even in the database', async () => {
    const sample = await sampleEstimate(api.ours);
    const { id } = (await issue(sample)).body as { id: string };
    const { database } = api.platform;
    const values = { id, workshopId: api.ours.id };
    const where = 'WHERE workshop_id = :workshopId AND id = :id';
    await expect(database.execute(`UPDATE issues SET gross_minor = 1 ${where}`, values)).rejects.toThrow(
      'stays as it was issued',
    );
    await expect(database.execute(`DELETE FROM issues ${where}`, values)).rejects.toThrow('is kept');
  });

  it('happens wholly or not at all, wherever it is cut off', async () => {
    const { sequelize } = api.platform.database;
    const query = sequelize.query.bind(sequelize);
    let reached = 0;
    for (let failing = 1; ; failing++) {
      const sample = await sampleEstimate(api.ours);
      const version = await versionOf(sample.estimateId);
      reached = 0;
      sequelize.query = ((...parts: Parameters<typeof query>) => {
        reached += 1;
        return reached === failing ? Promise.reject(new Error('cut off')) : query(...parts);
      }) as typeof sequelize.query;
      const response = await issue(sample, randomUUID(), version);
      sequelize.query = query;
      const issues = await api.app.estimates.issues.ofEstimate(api.ours.id, sample.estimateId);
      const { estimate } = await api.app.estimates.drafts.whole(api.ours.id, sample.estimateId);
      const isIssued = response.status === 200;
      expect(issues).toHaveLength(isIssued ? 1 : 0);
      expect(estimate.letter).toBe(isIssued ? 'A' : null);
      if (reached < failing) break;
    }
    expect(reached).toBeGreaterThan(10);
  }, 120_000);
});

describe('the papers of an issue', () => {
  const starts = {
    'estimate.pdf': '%PDF-',
    'estimate.xlsx': 'PK',
    'leaf-order.pdf': '%PDF-',
    'leaf-order.csv': '\ufeff',
  };

  async function paper(role: 'estimator' | 'office', issueId: string, name: string) {
    return api
      .as(role)
      .call(readPaper, { params: { issueId, paper: name } })
      .buffer(true)
      .parse(binary);
  }

  it('are kept byte for byte, and sent as files that no page may run', async () => {
    const { id } = (await issue(await sampleEstimate(api.ours))).body as { id: string };
    for (const [name, start] of Object.entries(starts)) {
      const response = await paper('estimator', id, name);
      expect(response.status).toBe(200);
      expect((response.body as Buffer).toString('utf8').startsWith(start)).toBe(true);
      expect(response.headers['content-disposition']).toMatch(/^attachment/);
      expect((await paper('estimator', id, name)).body).toEqual(response.body);
    }
  });

  it('with rates and margin in them are not for the office', async () => {
    const { id } = (await issue(await sampleEstimate(api.ours))).body as { id: string };
    expect((await paper('office', id, 'estimate.xlsx')).status).toBe(403);
    expect((await paper('office', id, 'estimate.pdf')).status).toBe(200);
  });
});

describe('removing a job', () => {
  const remove = async ({ jobId }: SampleEstimate) => {
    const { version } = await api.app.jobs.job(api.ours.id, jobId);
    return api.as('owner').call(removeJob, { params: { jobId }, version });
  };

  it('takes its drafts along', async () => {
    const sample = await sampleEstimate(api.ours);
    expect((await remove(sample)).status).toBeLessThan(300);
    expect((await read('owner', sample.estimateId)).status).toBe(404);
  });

  it('is refused once something was issued', async () => {
    const sample = await sampleEstimate(api.ours);
    await issue(sample);
    expect((await remove(sample)).status).toBe(409);
    expect((await read('owner', sample.estimateId)).status).toBe(200);
  });
});

describe('marking an issue', () => {
  it('follows its steps: sent, then accepted, and no further; the job follows', async () => {
    const sample = await sampleEstimate(api.ours);
    const { id } = (await issue(sample)).body as { id: string };
    const day = await api.app.rateCards.service.today(api.ours.id);
    const mark = (state: string) =>
      api.as('office').call(markIssue, { params: { issueId: id }, body: { state, day, note: '' } });
    expect((await mark('sent')).body).toMatchObject({ state: 'sent' });
    expect((await mark('accepted')).body).toMatchObject({ state: 'accepted' });
    expect((await mark('declined')).status).toBe(409);
    expect((await api.app.jobs.job(api.ours.id, sample.jobId)).state).toBe('accepted');
  });
});
