import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import * as z from 'zod';
import { bareEndpoint, endpoint, sameForAll } from '#shared/actor/endpoint';
import { factsOf, signIn } from '../../../test/sign-in';
import { ProblemError } from '../problems/problem-error';
import { Session } from '../session/session';
import { SESSION_PORT, type SessionPort } from '../session/session-port';
import { Api } from './api';

const readJob = endpoint({
  name: 'readJob',
  summary: '',
  method: 'get',
  path: '/api/jobs/:jobId',
  callers: ['owner', 'bench'],
  params: z.strictObject({ jobId: z.string() }),
  query: z.strictObject({ search: z.string().default(''), limit: z.coerce.number().default(50) }),
  answers: {
    cost: z.strictObject({ title: z.string(), cost_minor: z.int() }),
    bench: z.strictObject({ title: z.string() }),
  },
});
const keepJob = endpoint({
  name: 'keepJob',
  summary: '',
  method: 'put',
  path: '/api/jobs/:jobId',
  callers: ['owner'],
  params: z.strictObject({ jobId: z.string() }),
  body: z.strictObject({ title: z.string() }),
  versioned: true,
  idempotent: true,
  answers: sameForAll(z.strictObject({ title: z.string() })),
});
const putPicture = endpoint({
  name: 'putPicture',
  summary: '',
  method: 'put',
  path: '/api/picture',
  callers: ['owner'],
  body: z.strictObject({ caption: z.string() }),
  upload: 'picture',
  answers: {},
});
const readPaper = endpoint({
  name: 'readPaper',
  summary: '',
  method: 'get',
  path: '/api/paper',
  callers: ['owner'],
  media: 'application/pdf',
  answers: {},
});
const askStranger = endpoint({
  name: 'askStranger',
  summary: '',
  method: 'post',
  path: '/api/asking',
  callers: 'anyone',
  body: z.strictObject({ email: z.string() }),
  answers: {},
});

const problem = (status: number, more: object = {}) => ({
  type: 'urn:problem:problem-invalid',
  title: 'Some entries need another look.',
  status,
  instance: '',
  errors: [],
  ...more,
});

class Port implements SessionPort {
  wants = true;
  read = jest.fn(() => {
    TestBed.inject(Session).put(undefined, 'fresh-token');
    return Promise.resolve();
  });
  signOut = jest.fn(() => Promise.resolve());
  enter = jest.fn(() => Promise.resolve());
  signInAgain = jest.fn(() => {
    TestBed.inject(Session).put(factsOf(['owner']), 'fresh-token');
    return Promise.resolve(this.wants);
  });
}

describe('Api', () => {
  let api: Api;
  let http: HttpTestingController;
  let port: Port;

  beforeEach(() => {
    port = new Port();
    TestBed.configureTestingModule({
      providers: [provideHttpClient(), provideHttpClientTesting(), { provide: SESSION_PORT, useValue: port }],
    });
    api = TestBed.inject(Api);
    http = TestBed.inject(HttpTestingController);
  });

  afterEach(() => http.verify());

  const settle = () => new Promise((resolve) => setTimeout(resolve));

  it('writes parameters and query into the address, and leaves out what is empty', async () => {
    signIn();
    const answer = api.call(readJob, { params: { jobId: 'a/b' }, query: { search: '', limit: 10 } });
    const request = http.expectOne('/api/jobs/a%2Fb?limit=10');
    expect(request.request.headers.has('x-csrf-token')).toBe(false);
    request.flush({ title: 'Pier table', cost_minor: 120 });
    await expect(answer).resolves.toEqual({ title: 'Pier table', cost_minor: 120 });
  });

  it('parses by the schema of the person’s own audience, and refuses an answer that says more', async () => {
    signIn(['bench']);
    const answer = api.call(readJob, { params: { jobId: '1' }, query: {} });
    http.expectOne('/api/jobs/1').flush({ title: 'Pier table', cost_minor: 120 });
    await expect(answer).rejects.toThrow(/cost_minor/);
  });

  it('takes an answer at its word where the schemas of the endpoint stay away', async () => {
    signIn(['bench']);
    const bare = bareEndpoint<typeof readJob>({
      ...{ name: 'readJob', summary: '', method: 'get', path: '/api/jobs/:jobId', callers: ['owner', 'bench'] },
    });
    const answer = api.call(bare, { params: { jobId: '1' }, query: {} });
    http.expectOne('/api/jobs/1').flush({ title: 'Pier table', more: 'than the schema says' });
    await expect(answer).resolves.toEqual({ title: 'Pier table', more: 'than the schema says' });
  });

  it('sends the token of the session, the version seen and the key of a thing done once', async () => {
    signIn();
    const answer = api.call(keepJob, {
      params: { jobId: '1' },
      body: { title: 'Stand' },
      version: 4,
      idempotencyKey: 'key-of-this-intent',
    });
    const sent = http.expectOne({ method: 'PUT', url: '/api/jobs/1' });
    const { headers } = sent.request;
    expect([headers.get('x-csrf-token'), headers.get('if-match'), headers.get('idempotency-key')]).toEqual([
      'token-of-the-session',
      '"4"',
      'key-of-this-intent',
    ]);
    sent.flush({ title: 'Stand' });
    await expect(answer).resolves.toEqual({ title: 'Stand' });
  });

  it('sends a file under the field the endpoint names, with the plain fields beside it', async () => {
    signIn();
    const answer = api.call(putPicture, { body: { caption: 'before' }, file: new File(['x'], 'leg.png') });
    const request = http.expectOne('/api/picture');
    const form = request.request.body as FormData;
    expect([form.get('caption'), (form.get('picture') as File).name]).toEqual(['before', 'leg.png']);
    request.flush(null);
    await expect(answer).resolves.toBeUndefined();
  });

  it('gives a file as it came', async () => {
    signIn();
    const answer = api.call(readPaper, {});
    http.expectOne('/api/paper').flush(new Blob(['%PDF']));
    await expect(answer).resolves.toBeInstanceOf(Blob);
  });

  it('turns a refusal into a ProblemError with every complaint, also where a file was asked for', async () => {
    signIn();
    const errors = [{ path: ['title'], message: 'Please fill this in.' }];
    const answer = api.call(readPaper, {}).catch((error: unknown) => error);
    http
      .expectOne('/api/paper')
      .flush(new Blob([JSON.stringify(problem(400, { errors }))]), { status: 400, statusText: 'Bad Request' });
    const error = (await answer) as ProblemError;
    expect(error).toBeInstanceOf(ProblemError);
    expect(error.problem.errors).toEqual(errors);
  });

  it('tells an unreachable server from a refusal, and keeps how long to wait', async () => {
    signIn();
    const away = api.call(readPaper, {}).catch((error: unknown) => error);
    http.expectOne('/api/paper').error(new ProgressEvent('error'));
    expect(((await away) as ProblemError).isUnreachable).toBe(true);
    const busy = api.call(readPaper, {}).catch((error: unknown) => error);
    http.expectOne('/api/paper').flush(new Blob([JSON.stringify(problem(429))]), {
      status: 429,
      statusText: 'Too Many',
      headers: { 'retry-after': '30' },
    });
    expect(((await busy) as ProblemError).retryAfter_seconds).toBe(30);
  });

  it('asks for the password over the page when the session has ended, and sends the call once more', async () => {
    signIn();
    const answer = api.call(readJob, { params: { jobId: '1' }, query: {} });
    http.expectOne('/api/jobs/1').flush(problem(401), { status: 401, statusText: 'Unauthorized' });
    await settle();
    http.expectOne('/api/jobs/1').flush({ title: 'Pier table', cost_minor: 1 });
    await expect(answer).resolves.toEqual({ title: 'Pier table', cost_minor: 1 });
    expect(port.signInAgain).toHaveBeenCalledTimes(1);
  });

  it('asks once for several calls, and a token that is out of date counts as an ended session', async () => {
    signIn();
    const calls = [1, 2].map((version) =>
      api.call(keepJob, {
        params: { jobId: '1' },
        body: { title: 'Stand' },
        version,
        idempotencyKey: `key-number-${version}-xx`,
      }),
    );
    const forged = problem(403, { type: 'urn:problem:problem-forged' });
    for (const request of http.match('/api/jobs/1')) request.flush(forged, { status: 403, statusText: 'Forbidden' });
    await settle();
    const again = http.match('/api/jobs/1');
    expect(again.map(({ request }) => request.headers.get('x-csrf-token'))).toEqual(['fresh-token', 'fresh-token']);
    for (const request of again) request.flush({ title: 'Stand' });
    await Promise.all(calls);
    expect(port.signInAgain).toHaveBeenCalledTimes(1);
  });

  it('gives the refusal on when the person would rather not sign in', async () => {
    signIn();
    port.wants = false;
    const answer = api.call(readJob, { params: { jobId: '1' }, query: {} });
    http.expectOne('/api/jobs/1').flush(problem(401), { status: 401, statusText: 'Unauthorized' });
    await expect(answer).rejects.toBeInstanceOf(ProblemError);
  });

  it('fetches a fresh token for a stranger without asking them anything', async () => {
    const answer = api.call(askStranger, { body: { email: 'a@b.example' } });
    http
      .expectOne('/api/asking')
      .flush(problem(403, { type: 'urn:problem:problem-forged' }), { status: 403, statusText: 'Forbidden' });
    await settle();
    const again = http.expectOne('/api/asking');
    expect(again.request.headers.get('x-csrf-token')).toBe('fresh-token');
    again.flush(null);
    await answer;
    expect(port.signInAgain).not.toHaveBeenCalled();
  });

  it('stops waiting when it is told to', async () => {
    signIn();
    const control = new AbortController();
    const answer = api.call(readJob, { params: { jobId: '1' }, query: {}, signal: control.signal });
    const request = http.expectOne('/api/jobs/1');
    control.abort();
    await expect(answer).rejects.toThrow(/abort/i);
    expect(request.cancelled).toBe(true);
  });
});
