import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideRouter, withComponentInputBinding } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import type { Role } from '#shared/actor/role';
import type { Job } from '#shared/jobs/job-schema';
import { signIn, words } from '../../test/sign-in';
import { SESSION_PORT } from '../core/session/session-port';
import { JobsPage } from './jobs-page';

const id = (number: number) => `018f0000-0000-7000-8000-0000000000${number}`;
const job = (number: number, more: Partial<Job> = {}): Job => ({
  ...{ id: id(number), version: 1, number: `2026-0${number}`, title: `Base ${number}`, clientId: id(90) },
  ...{ clientName: 'Ashgrove House', kind: 'new', reference: '', site: '', note: '', state: 'open' },
  changedAt: '2026-05-04T10:00:00.000Z',
  ...more,
});

describe('JobsPage', () => {
  let http: HttpTestingController;
  let harness: RouterTestingHarness;
  const element = () => harness.routeNativeElement as HTMLElement;
  const settle = async (time_ms = 0) => {
    await new Promise((resolve) => setTimeout(resolve, time_ms));
    TestBed.tick();
  };
  const links = () => [...element().querySelectorAll<HTMLElement>('a[data-row]')];
  const button = (text: string) =>
    [...element().querySelectorAll('button')].find((one) => one.textContent?.trim() === text);
  const answer = async (items: readonly Job[], more: object = {}) => {
    const request = http.expectOne(({ url }) => url.startsWith('/api/jobs'));
    request.flush({ items, next: null, count: items.length, countIsExact: true, ...more });
    await settle();
    return new URL(request.request.url, 'http://here').searchParams;
  };

  async function open(roles: readonly Role[], address = '/jobs') {
    TestBed.configureTestingModule({
      providers: [
        ...[words, provideHttpClient(), provideHttpClientTesting(), { provide: SESSION_PORT, useValue: {} }],
        provideRouter([{ path: 'jobs', component: JobsPage }], withComponentInputBinding()),
      ],
    });
    signIn(roles);
    http = TestBed.inject(HttpTestingController);
    harness = await RouterTestingHarness.create(address);
  }

  it('shows number, title, client and state, each row leading to its job', async () => {
    await open(['owner']);
    await answer([job(11, { state: 'sent', kind: 'restoration' })]);
    const row = element().querySelector('tbody tr')?.textContent;
    expect(
      ['2026-011', 'Base 11', 'restoration', 'Ashgrove House', 'with the client'].filter(
        (text) => !row?.includes(text),
      ),
    ).toEqual([]);
    expect(links()[0].getAttribute('href')).toBe(`/jobs/${id(11)}`);
  });

  it('searches as one types, and keeps the search in the address', async () => {
    await open(['owner']);
    await answer([job(11), job(12)]);
    const entry = element().querySelector<HTMLInputElement>('input[type=search]') as HTMLInputElement;
    for (const text of ['h', 'he', 'her']) {
      entry.value = text;
      entry.dispatchEvent(new Event('input'));
      await settle();
    }
    http.expectNone(({ url }) => url.startsWith('/api/jobs'));
    await settle(250);
    expect((await answer([job(12)])).get('search')).toBe('her');
    expect(links()).toHaveLength(1);
  });

  it('begins as the address says', async () => {
    await open(['owner'], `/jobs?search=pier&state=accepted&order=title&client=${id(90)}`);
    const asked = await answer([job(11)]);
    expect(Object.fromEntries(asked)).toMatchObject({
      search: 'pier',
      state: 'accepted',
      order: 'title',
      clientId: id(90),
    });
  });

  it('makes nothing of a state or an order there is not', async () => {
    await open(['owner'], '/jobs?state=stolen&order=luck');
    const asked = await answer([]);
    expect([asked.get('state'), asked.get('order')]).toEqual([null, 'changed']);
  });

  it('goes on where the page ended', async () => {
    await open(['owner']);
    await answer([job(11)], { next: 'after-11', count: 1000, countIsExact: false });
    expect(element().textContent).toContain('1 of more than 1000 shown');
    button('Show more')?.click();
    expect((await answer([job(12)])).get('cursor')).toBe('after-11');
    expect(links()).toHaveLength(2);
  });

  it('teaches what a job is where there is none, and offers to open it', async () => {
    await open(['estimator']);
    await answer([]);
    expect(element().textContent).toContain('Open the first job');
    expect(element().querySelector('a[href="/jobs/new"]')).not.toBeNull();
  });

  it('says so where no job fits, and shows all again', async () => {
    await open(['owner'], '/jobs?search=unicorn');
    await answer([]);
    expect(element().textContent).toContain('No job fits');
    button('Show all jobs')?.click();
    await settle();
    expect((await answer([job(11)])).get('search')).toBeNull();
  });

  it('lets the bench read, and neither open jobs nor look up clients', async () => {
    await open(['bench']);
    await answer([job(11)]);
    expect(links()).toHaveLength(1);
    expect(element().querySelector('a[href="/jobs/new"], app-client-field')).toBeNull();
  });

  it('is walked through with the arrows', async () => {
    await open(['owner']);
    await answer([job(11), job(12)]);
    const press = (target: Element | null, key: string) =>
      target?.dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true }));
    press(element().querySelector('input[type=search]'), 'ArrowDown');
    expect(document.activeElement).toBe(links()[0]);
    press(document.activeElement, 'ArrowDown');
    expect(document.activeElement).toBe(links()[1]);
    press(document.activeElement, 'ArrowUp');
    expect(document.activeElement).toBe(links()[0]);
  });
});
