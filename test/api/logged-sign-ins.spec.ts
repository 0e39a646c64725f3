import { enterWorkshop, signIn } from '#shared/accounts/session-endpoints';
import { foundAnother } from '#shared/accounts/workshop-endpoints';
import type { Response } from 'supertest';
import { whoIs } from './logged-refusals';
import { password, startApi, type Api } from './start-api';
import { foundingSettings } from './test-workshop';

/** Each sign-in leaves one line that says who came in, and to which workshop (ASVS 16.2.1, 16.3.1). */
let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterAll(() => api.stop());

const linesOf = ({ headers }: Response): Record<string, unknown>[] =>
  api.logLines
    .filter((line) => line.includes(String(headers['x-request-id'])))
    .map((line) => JSON.parse(line) as Record<string, unknown>);

test('a sign-in is told with who came, and where', async () => {
  const person = api.ours.people.bench;
  const visitor = await api.stranger();
  const lines = linesOf(await visitor.signIn(person.email, password));
  expect(lines).toEqual([
    expect.objectContaining({ ...whoIs(person), msg: 'request', method: 'POST', path: signIn.path, status: 200 }),
  ]);
});

test('whoever founds a workshop or enters another is told in the one they come to', async () => {
  const { visitor, actor } = await api.newcomer(api.ours, 'bench');
  const founded = await visitor.call(foundAnother, { body: { name: 'Second Bench', ...foundingSettings } });
  const { signedIn } = founded.body as { signedIn: { workshop: { id: string } } };
  expect(linesOf(founded)).toEqual([
    expect.objectContaining({ accountId: actor.accountId, workshopId: signedIn.workshop.id }),
  ]);
  const back = await visitor.call(enterWorkshop, { body: { membershipId: actor.membershipId } });
  expect(linesOf(back)).toEqual([
    expect.objectContaining({ accountId: actor.accountId, workshopId: actor.workshopId, status: 200 }),
  ]);
});
