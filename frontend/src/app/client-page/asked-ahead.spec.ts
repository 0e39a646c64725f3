import { addressOf } from '../core/api/address-of';
import { readSession } from '#shared/accounts/session-endpoints';
import { readClientIssue, readClientOverview } from '#shared/client-page/client-issues-endpoints';
import { beginClientVisit } from '#shared/client-page/visits-endpoints';
import { clientId, clientIssue } from '../../test/client-issue';
import { AskedAhead } from './asked-ahead';

const { issue } = clientIssue();
const job = { id: clientId(11), number: '2026-014', title: 'Pier table' };
const papers = (issues: readonly object[]) => ({ jobs: [{ ...job, issues }], invoices: [] });

/** As much of an answer as is read here. */
const answer = (body: unknown, status = 200) => {
  const response = { ok: status < 400, status, json: () => Promise.resolve(body) };
  return { ...response, clone: () => response } as Response;
};

/** A server that is asked, and what of it. */
function served(visit: Response = answer({ token: 'of the visit', papers: papers([issue]) })) {
  const requests: [address: string, request: RequestInit][] = [];
  const show = jest.fn();
  const ask = (address: unknown, request: RequestInit = {}) => {
    requests.push([address as string, request]);
    return Promise.resolve(request.method === 'POST' ? visit : answer({ token: 'of the session', ...issue }));
  };
  const ahead = new AskedAhead(ask, show);
  return { ahead, requests, show, asked: () => requests.map(([address, { method }]) => `${method} ${address}`) };
}
const settled = () => new Promise((resolve) => setTimeout(resolve));
const called = ({ method, path }: { method: string; path: string }) => `${method.toUpperCase()} ${path}`;
const ofIssue = addressOf(readClientIssue, { params: { issueId: issue.id } });

describe('AskedAhead', () => {
  it('begins the visit of a link under the session, and then asks for the first paper', async () => {
    const { ahead, requests, asked } = served();
    ahead.begin({ pathname: '/client', hash: '#a-secret' });
    await settled();
    expect(asked()).toEqual([called(readSession), called(beginClientVisit), `GET ${ofIssue}`]);
    const [, [, visit]] = requests;
    expect(visit.headers).toMatchObject({ 'x-csrf-token': 'of the session', 'content-type': 'application/json' });
    expect(visit.body).toBe('{"token":"a-secret"}');
  });

  it('shows the head of the paper as soon as it is known', async () => {
    const { ahead, show } = served();
    ahead.begin({ pathname: `/client/issues/${issue.id}`, hash: '' });
    await settled();
    expect(show).toHaveBeenCalledTimes(1);
    expect(show).toHaveBeenCalledWith(expect.objectContaining({ id: issue.id }));
  });

  it('has asked for the first paper before anybody hears of the visit', async () => {
    const { ahead } = served();
    ahead.begin({ pathname: '/client', hash: '#a-secret' });
    await ahead.answerTo('POST', beginClientVisit.path);
    expect(ahead.answerTo('GET', ofIssue)).toBeDefined();
  });

  it('asks for the list where no one paper comes first, and for nothing more where the link is closed', async () => {
    const listed = served(answer({ token: '', papers: papers([]) }));
    listed.ahead.begin({ pathname: '/client', hash: '#a-secret' });
    const closed = served(answer({}, 410));
    closed.ahead.begin({ pathname: '/client', hash: '#a-secret' });
    await settled();
    expect(listed.asked()).toContain(called(readClientOverview));
    expect(closed.asked()).toEqual([called(readSession), called(beginClientVisit)]);
    expect((await closed.ahead.answerTo('POST', beginClientVisit.path))?.status).toBe(410);
  });

  it.each([
    [`/client/issues/${issue.id}`, '', [called(readSession), `GET ${ofIssue}`]],
    ['/client/papers', '', [called(readSession), called(readClientOverview)]],
    ['/client', '', [called(readSession)]],
    ['/client/sign-in', '#a-secret', [called(readSession)]],
  ])('of %s%s asks what that page will', async (pathname, hash, expected) => {
    const { ahead, asked } = served();
    ahead.begin({ pathname, hash });
    await settled();
    expect(asked()).toEqual(expected);
  });

  it('gives each answer once', async () => {
    const { ahead } = served();
    ahead.begin({ pathname: '/client/papers', hash: '' });
    await expect(ahead.answerTo('GET', '/api/session')).resolves.toBeDefined();
    expect(ahead.answerTo('GET', '/api/session')).toBeUndefined();
    expect(ahead.answerTo('POST', '/api/client/overview')).toBeUndefined();
  });
});
