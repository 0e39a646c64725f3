import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { Router, provideRouter, withComponentInputBinding } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import type { Role } from '#shared/actor/role';
import type { Job } from '#shared/jobs/job-schema';
import { signIn, words } from '../../test/sign-in';
import { Notices } from '../core/problems/notices';
import { SESSION_PORT } from '../core/session/session-port';
import { Confirm } from '../ui/dialog/confirm';
import { LATER_WIDGETS } from '../core/routing/later-widgets';
import { JobPage } from './job-page';

const id = (number: number) => `018f0000-0000-7000-8000-0000000000${number}`;
const job: Job = {
  ...{
    id: id(11),
    version: 4,
    number: '2026-011',
    title: 'Pier table',
    clientId: id(90),
    clientName: 'Ashgrove House',
  },
  ...{ kind: 'new', reference: '', site: 'Saloon', note: '', state: 'open', changedAt: '2026-05-04T10:00:00.000Z' },
};
const opened = {
  ...{
    id: id(31),
    at: '2026-05-04T10:00:00.000Z',
    accountId: id(32),
    name: 'Imke Vale',
    before: null,
    after: null,
    changes: [],
  },
  ...{
    subject: { kind: 'job', id: id(11) },
    code: 'history-job-opened',
    values: { number: '2026-011', title: 'Pier table' },
  },
};

const planned = {
  ...opened,
  id: id(33),
  code: 'history-plan-kept',
  values: { number: '2026-011-1', starts: '2026-05-04', finishes: '2026-06-12' },
};

@Component({
  selector: 'app-its-estimates',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `{{ text() }}`,
})
class ItsEstimates {
  readonly job = input.required<Job>();
  protected readonly text = computed(() => `Estimates of ${this.job().title}`);
}

@Component({ selector: 'app-nowhere', changeDetection: ChangeDetectionStrategy.OnPush, template: '' })
class Nowhere {}

describe('JobPage', () => {
  let http: HttpTestingController;
  let harness: RouterTestingHarness;
  const questions: unknown[] = [];
  const element = () => harness.routeNativeElement as HTMLElement;
  const settle = async () => {
    await new Promise((resolve) => setTimeout(resolve));
    TestBed.tick();
  };
  const button = (text: string) =>
    [...element().querySelectorAll('button')].find((one) => one.textContent?.trim() === text);
  const history = () => http.match(({ url }) => url.startsWith('/api/history'));

  async function open(roles: readonly Role[]) {
    questions.splice(0);
    const confirm = { ask: (question: unknown) => (questions.push(question), Promise.resolve(true)) };
    TestBed.configureTestingModule({
      providers: [
        ...[words, provideHttpClient(), provideHttpClientTesting(), { provide: SESSION_PORT, useValue: {} }],
        { provide: Confirm, useValue: confirm },
        { provide: LATER_WIDGETS, useValue: { 'job-estimates': () => Promise.resolve(ItsEstimates) } },
        provideRouter(
          [
            { path: 'jobs/:jobId', component: JobPage },
            { path: 'jobs', component: Nowhere },
          ],
          withComponentInputBinding(),
        ),
      ],
    });
    signIn(roles);
    http = TestBed.inject(HttpTestingController);
    harness = await RouterTestingHarness.create(`/jobs/${id(11)}`);
    await settle();
    http.expectOne(`/api/jobs/${id(11)}`).flush(job);
    await settle();
    history().forEach((request) =>
      request.flush({ items: [planned, opened], next: null, count: 2, countIsExact: true }),
    );
    await settle();
  }

  it('shows what is known of the job, its estimates and its history in words', async () => {
    await open(['owner']);
    const text = element().textContent ?? '';
    const said = ['Pier table', '2026-011, Ashgrove House', 'open', 'Saloon', 'Estimates of Pier table'];
    expect(
      [
        ...said,
        'Opened job 2026-011, Pier table.',
        'Planned estimate 2026-011-1: 4 May 2026 to 12 Jun 2026',
        'Imke Vale',
      ].filter((one) => !text.includes(one)),
    ).toEqual([]);
  });

  it('puts the job away, on the version it shows, and reads its history anew', async () => {
    await open(['office']);
    button('Put away as finished')?.click();
    await settle();
    const request = http.expectOne({ method: 'PUT', url: `/api/jobs/${id(11)}/finished` });
    expect([request.request.body, request.request.headers.get('if-match')]).toEqual([{ isFinished: true }, '"4"']);
    request.flush({ ...job, version: 5, state: 'finished', changedAt: '2026-05-05T10:00:00.000Z' });
    await settle();
    expect(button('Take it up again')).toBeDefined();
    expect(history()).toHaveLength(1);
  });

  it('removes the job after asking, and goes to the list', async () => {
    await open(['estimator']);
    button('Remove the job')?.click();
    await settle();
    expect(questions).toHaveLength(1);
    http
      .expectOne({ method: 'DELETE', url: `/api/jobs/${id(11)}` })
      .flush(null, { status: 204, statusText: 'No Content' });
    await settle();
    expect(TestBed.inject(Router).url).toBe('/jobs');
    expect(
      TestBed.inject(Notices)
        .current()
        .map(({ text }) => text),
    ).toEqual(['Job 2026-011 is removed.']);
  });

  it('lets the bench read what is known, and nothing else', async () => {
    await open(['bench']);
    expect(element().textContent).toContain('Saloon');
    expect(element().querySelectorAll('button, app-job-history')).toHaveLength(0);
  });
});
