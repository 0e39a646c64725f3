import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import type { Client } from '#shared/jobs/client-schema';
import type { Job } from '#shared/jobs/job-schema';
import { signIn, words } from '../../test/sign-in';
import { SESSION_PORT } from '../core/session/session-port';
import { JobForm } from './job-form';

const id = (number: number) => `018f0000-0000-7000-8000-0000000000${number}`;
const client: Client = {
  ...{ id: id(90), version: 1, name: 'Ashgrove House', kind: 'institution', contact: '', email: '', telephone: '' },
  ...{ address: '', website: '', taxRegistration: '', note: '', jobs: 0 },
};
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

describe('JobForm', () => {
  let fixture: ComponentFixture<JobForm>;
  let http: HttpTestingController;
  const kept: Job[] = [];
  const element = () => fixture.nativeElement as HTMLElement;
  const settle = async (time_ms = 0) => {
    await new Promise((resolve) => setTimeout(resolve, time_ms));
    TestBed.tick();
  };
  const button = (text: string) =>
    [...element().querySelectorAll('button')].find((one) => one.textContent?.trim() === text);
  const entry = (name: string) => element().querySelector<HTMLInputElement>(`[name=${name}]`) as HTMLInputElement;
  const clientEntry = () => element().querySelector<HTMLInputElement>('app-client-field input') as HTMLInputElement;
  const type = (target: HTMLInputElement, text: string) => {
    target.value = text;
    target.dispatchEvent(new Event('input'));
  };
  const putting = () => http.expectOne(({ method }) => method === 'PUT');

  async function open(given?: Job) {
    kept.splice(0);
    TestBed.configureTestingModule({
      providers: [words, provideHttpClient(), provideHttpClientTesting(), { provide: SESSION_PORT, useValue: {} }],
    });
    signIn(['owner']);
    http = TestBed.inject(HttpTestingController);
    fixture = TestBed.createComponent(JobForm);
    if (given) fixture.componentRef.setInput('job', given);
    fixture.componentInstance.kept.subscribe((one) => kept.push(one));
    TestBed.tick();
    await settle();
  }

  async function chooseClient(text: string) {
    clientEntry().dispatchEvent(new Event('focusin'));
    type(clientEntry(), text);
    await settle(250);
    http
      .expectOne(({ url }) => url.startsWith('/api/clients?search='))
      .flush({ items: [client], next: null, count: 1, countIsExact: true });
    await settle();
    clientEntry().dispatchEvent(new Event('blur'));
    await settle();
  }

  it('opens a job for a client found by typing, once however often it is sent', async () => {
    await open();
    type(entry('title'), 'Pier table');
    await chooseClient('ashgrove house');
    expect(clientEntry().value).toBe('Ashgrove House');
    button('Open the job')?.click();
    await settle();
    const first = putting();
    first.error(new ProgressEvent('error'));
    await settle();
    button('Open the job')?.click();
    await settle();
    const second = putting();
    expect(second.request.url).toBe(first.request.url);
    expect(second.request.headers.get('if-match')).toBe('"0"');
    expect(second.request.body).toEqual({
      title: 'Pier table',
      clientId: id(90),
      kind: 'new',
      reference: '',
      site: '',
      note: '',
    });
    second.flush(job);
    await settle();
    expect(kept).toEqual([job]);
  });

  it('wants a client from the list', async () => {
    await open();
    type(entry('title'), 'Pier table');
    await chooseClient('Ashgrove');
    expect(element().textContent).toContain('Choose a client from the list.');
    button('Open the job')?.click();
    await settle();
    http.expectNone(({ method }) => method === 'PUT');
  });

  it('shows the client of the job by name', async () => {
    await open(job);
    http.expectOne(`/api/clients/${id(90)}`).flush(client);
    await settle();
    expect(clientEntry().value).toBe('Ashgrove House');
  });

  it('shows both sides where somebody was faster, and keeps one’s own over theirs when told', async () => {
    await open(job);
    http.expectOne(`/api/clients/${id(90)}`).flush(client);
    await settle();
    type(entry('site'), 'Hall');
    button('Keep the particulars')?.click();
    await settle();
    const current = { ...job, version: 7, site: 'Stair', note: 'Mind the cat' };
    const stale = { type: 'x', title: 'Somebody else was faster.', status: 412, instance: '', errors: [], current };
    const request = putting();
    expect(request.request.headers.get('if-match')).toBe('"4"');
    request.flush(stale, { status: 412, statusText: 'Precondition Failed' });
    await settle();
    const sides = element().querySelector('app-two-sides')?.textContent ?? '';
    expect(['Stair', 'Hall', 'Mind the cat'].filter((text) => !sides.includes(text))).toEqual([]);
    button('Keep mine')?.click();
    await settle();
    const over = putting();
    expect([over.request.headers.get('if-match'), (over.request.body as Job).site]).toEqual(['"7"', 'Hall']);
    over.flush({ ...current, version: 8, site: 'Hall' });
    await settle();
    expect(kept).toHaveLength(1);
  });

  it('takes what is kept when told', async () => {
    await open(job);
    http.expectOne(`/api/clients/${id(90)}`).flush(client);
    await settle();
    type(entry('site'), 'Hall');
    button('Keep the particulars')?.click();
    await settle();
    const current = { ...job, version: 7, site: 'Stair' };
    const stale = { type: 'x', title: 'Somebody else was faster.', status: 412, instance: '', errors: [], current };
    putting().flush(stale, { status: 412, statusText: 'Precondition Failed' });
    await settle();
    button('Take what is kept now')?.click();
    await settle();
    expect(entry('site').value).toBe('Stair');
    expect(kept).toEqual([current]);
  });
});
