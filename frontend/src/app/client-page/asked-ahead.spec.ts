import { addressOf } from '../core/api/address-of';
import { readSession } from '#shared/accounts/session-endpoints';
import { readClientIssue, readClientOverview } from '#shared/client-page/client-issues-endpoints';
import { beginClientVisit } from '#shared/client-page/visits-endpoints';
import { clientIssue } from '../../test/client-issue';
import { AskedAhead } from './asked-ahead';

const paper = clientIssue();
const papers = { letterhead: paper.letterhead, client: { name: 'Helena Marsh' }, jobs: [], invoices: [] };

/** As much of an answer as is read here. */
const answer = (body: unknown, status = 200) =>
  ({
    ...{ ok: status < 400, status, url: '', headers: new Map([['retry-after', '7']]) },
    json: () => Promise.resolve(body),
  }) as unknown as Response;

/** A server that is asked, and what of it. */
function served(visit: Response = answer({ token: 'of the visit', papers, issue: paper }), reading = answer(paper)) {
  const requests: [address: string, request: RequestInit][] = [];
  const show = { issue: jest.fn(), papers: jest.fn() };
  const ask = (address: unknown, request: RequestInit = {}) => {
    requests.push([address as string, request]);
    if (request.method === 'POST') return Promise.resolve(visit);
    return Promise.resolve(
      address === readSession.path ? answer({ token: 'of the session', signedIn: null }) : reading,
    );
  };
  const ahead = new AskedAhead(ask, show);
  return { ahead, requests, show, asked: () => requests.map(([address, { method }]) => `${method} ${address}`) };
}
const called = ({ method, path }: { method: string; path: string }) => `${method.toUpperCase()} ${path}`;
const ofIssue = addressOf(readClientIssue, { params: { issueId: paper.issue.id } });
const link = { pathname: '/client', hash: '#a-secret' };

describe('AskedAhead', () => {
  it('begins the visit of a link under the session, has the first paper with it, and says where that is read', async () => {
    const { ahead, requests, asked, show } = served();
    expect(await ahead.begin(link)).toBe(ofIssue.replace('/api', ''));
    expect(asked()).toEqual([called(readSession), called(beginClientVisit)]);
    const [, [, visit]] = requests;
    expect(visit.headers).toMatchObject({ 'x-csrf-token': 'of the session', 'content-type': 'application/json' });
    expect(visit.body).toBe('{"token":"a-secret"}');
    expect(show.issue).toHaveBeenCalledWith(paper);
    expect(show.papers).not.toHaveBeenCalled();
    await expect(ahead.answerTo('GET', ofIssue)).resolves.toMatchObject({ ok: true, status: 200, body: paper });
  });

  it('has the list with it where no one paper comes first', async () => {
    const { ahead, asked, show } = served(answer({ token: '', papers, issue: null }));
    expect(await ahead.begin(link)).toBe('/client/papers');
    expect(asked()).toEqual([called(readSession), called(beginClientVisit)]);
    expect(show.papers).toHaveBeenCalledWith(papers);
    await expect(ahead.answerTo('GET', readClientOverview.path)).resolves.toMatchObject({ ok: true, body: papers });
  });

  it('has the session of the visit with it, for whoever asks after that', async () => {
    const { ahead } = served();
    await ahead.begin(link);
    await expect(ahead.answerTo('GET', readSession.path)).resolves.toMatchObject({
      ...{ ok: true, url: readSession.path, body: { token: 'of the visit', signedIn: null } },
    });
  });

  it('has the first paper before anybody hears of the visit', async () => {
    const { ahead } = served();
    void ahead.begin(link);
    await ahead.answerTo('POST', beginClientVisit.path);
    expect(ahead.answerTo('GET', ofIssue)).toBeDefined();
  });

  it('shows and asks nothing more where the link is closed, and hands the refusal on', async () => {
    const { ahead, asked, show } = served(answer({ title: 'Closed.' }, 410));
    expect(await ahead.begin(link)).toBeUndefined();
    expect(asked()).toEqual([called(readSession), called(beginClientVisit)]);
    expect(show.issue).not.toHaveBeenCalled();
    expect(await ahead.answerTo('POST', beginClientVisit.path)).toMatchObject({
      ...{ ok: false, status: 410, body: { title: 'Closed.' }, headers: { 'retry-after': '7' } },
    });
  });

  it('shows the head of the paper whose page is opened', async () => {
    const { ahead, show } = served();
    await ahead.begin({ pathname: ofIssue.replace('/api', ''), hash: '' });
    expect(show.issue).toHaveBeenCalledWith(paper);
  });

  it('shows nothing of a paper that is refused, or whose answer does not come', async () => {
    const refused = served(undefined, answer({}, 404));
    await refused.ahead.begin({ pathname: ofIssue.replace('/api', ''), hash: '' });
    const cut = { ok: true, headers: new Map(), json: () => Promise.reject(new TypeError('cut off')) };
    const lost = served(undefined, cut as unknown as Response);
    await lost.ahead.begin({ pathname: '/client/papers', hash: '' });
    expect(refused.show.issue).not.toHaveBeenCalled();
    expect(lost.show.papers).not.toHaveBeenCalled();
  });

  it.each([
    [`/client/issues/${paper.issue.id}`, '', [called(readSession), `GET ${ofIssue}`]],
    ['/client/papers', '', [called(readSession), called(readClientOverview)]],
    ['/client', '', [called(readSession)]],
    ['/client/sign-in', '#a-secret', [called(readSession)]],
  ])('of %s%s asks what that page will', async (pathname, hash, expected) => {
    const { ahead, asked } = served();
    await ahead.begin({ pathname, hash });
    expect(asked()).toEqual(expected);
  });

  it('gives each answer once', async () => {
    const { ahead } = served();
    await ahead.begin({ pathname: '/client/papers', hash: '' });
    await expect(ahead.answerTo('GET', readSession.path)).resolves.toBeDefined();
    expect(ahead.answerTo('GET', readSession.path)).toBeUndefined();
    expect(ahead.answerTo('POST', readClientOverview.path)).toBeUndefined();
  });
});
