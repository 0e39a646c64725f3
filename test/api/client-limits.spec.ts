import { askClientQuestion } from '#shared/client-page/client-issues-endpoints';
import { askForClientSignIn } from '#shared/client-page/visits-endpoints';
import { linkTo, sampleIssue, visitBy } from './sample-client-visit';
import { startApi, type Api } from './start-api';

/** What clients may ask for is counted by who it is about and by where it comes from, in the database, whatever else they may do. */
let api: Api;
beforeEach(async () => {
  api = await startApi();
}, 60_000);
afterEach(() => api.stop());

const letter = async (email: string) => (await api.stranger()).call(askForClientSignIn, { body: { email } });
const times = async <T>(count: number, work: (time: number) => PromiseLike<T>): Promise<T[]> => {
  const answers: T[] = [];
  for (let time = 0; time < count; time++) answers.push(await work(time));
  return answers;
};
const statuses = (answers: readonly { readonly status: number }[]) => [...new Set(answers.map(({ status }) => status))];

describe('Letters to sign in by', () => {
  it('are counted by the address they go to, known or not, however it is written, and only that one waits', async () => {
    expect(statuses(await times(5, () => letter('nobody@elsewhere.example')))).toEqual([204]);
    const refused = await letter('Nobody@Elsewhere.example');
    expect([refused.status, refused.headers['retry-after']]).toEqual([429, '1']);
    expect(refused.body).toMatchObject({
      type: 'urn:problem:sign-in-letter-too-often',
      title: expect.stringContaining('wait 1 second and') as string,
    });
    expect((await letter('somebody.else@elsewhere.example')).status).toBe(204);
    api.clock.move({ seconds: 2 });
    expect((await letter('nobody@elsewhere.example')).status).toBe(204);
    // Each one more doubles the wait.
    expect((await letter('nobody@elsewhere.example')).headers['retry-after']).toBe('2');
    api.clock.move({ minutes: 61 });
    expect(statuses(await times(5, () => letter('nobody@elsewhere.example')))).toEqual([204]);
  });

  it('are counted by where they are asked from, so that none goes through a list of addresses', async () => {
    expect(statuses(await times(30, (time) => letter(`person${time}@elsewhere.example`)))).toEqual([204]);
    expect((await letter('one.more@elsewhere.example')).status).toBe(429);
  });

  it('asked for all at once are no way around', async () => {
    const answers = await Promise.all(Array.from({ length: 20 }, () => letter('nobody@elsewhere.example')));
    expect(answers.filter(({ status }) => status === 204).length).toBeLessThanOrEqual(6);
    expect(statuses(answers).sort()).toEqual([204, 429]);
  });
});

describe('Questions of a client', () => {
  it('are counted by the client, whichever link they come by; another client goes on asking', async () => {
    const [own, other] = [await sampleIssue(api.ours, api), await sampleIssue(api.ours, api)];
    const visitorOf = async (issueId: string) => visitBy(api, (await linkTo(api.ours, api, issueId)).token);
    const [first, second, another] = [
      await visitorOf(own.issueId),
      await visitorOf(own.issueId),
      await visitorOf(other.issueId),
    ];
    const ask = (visitor: typeof first, issueId: string) =>
      visitor.call(askClientQuestion, { params: { issueId }, body: { text: 'May the edge stay plain?' } });
    const asked = await times(12, (time) => ask(time % 2 === 0 ? first : second, own.issueId));
    expect(asked.filter(({ status }) => status >= 300)).toEqual([]);
    const refused = await ask(second, own.issueId);
    expect([refused.status, refused.headers['retry-after']]).toEqual([429, '1']);
    expect(refused.body).toMatchObject({ type: 'urn:problem:question-too-often' });
    expect((await ask(another, other.issueId)).status).toBeLessThan(300);
    const [{ kept }] = await api.platform.database.select<{ kept: number }>('SELECT COUNT(*) AS kept FROM questions');
    expect(Number(kept)).toBe(13);
  });
});
