import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import type { Role } from '#shared/actor/role';
import { signIn, words } from '../../test/sign-in';
import { SESSION_PORT } from '../core/session/session-port';
import { JobEstimates } from './job-estimates';

const id = (number: number) => `018f0000-0000-7000-8000-0000000000${number}`;
const job = { id: id(30), title: 'Pier table', state: 'open' };
const estimate = {
  ...{ id: id(31), number: '2026-007-1', title: 'Pier table', kind: 'estimate', letter: 'B', members: 12 },
  changedAt: '2026-03-02T09:30:00.000Z',
};

describe('JobEstimates', () => {
  let fixture: ComponentFixture<JobEstimates>;
  let http: HttpTestingController;
  const element = () => fixture.nativeElement as HTMLElement;
  const spoken = (node: Element | null | undefined) => (node?.textContent ?? '').replace(/\s+/g, ' ').trim();
  const settle = async () => {
    await new Promise((resolve) => setTimeout(resolve));
    await fixture.whenStable();
  };
  const button = (text: string) => [...element().querySelectorAll('button')].find((one) => spoken(one) === text);

  async function open(items: unknown[], roles: readonly Role[] = ['estimator'], state = 'open'): Promise<void> {
    TestBed.configureTestingModule({
      providers: [
        words,
        provideRouter([]),
        provideHttpClient(),
        provideHttpClientTesting(),
        { provide: SESSION_PORT, useValue: {} },
      ],
    });
    signIn(roles);
    http = TestBed.inject(HttpTestingController);
    fixture = TestBed.createComponent(JobEstimates);
    fixture.componentRef.setInput('job', { ...job, state });
    TestBed.tick();
    TestBed.tick();
    http.expectOne(`/api/jobs/${job.id}/estimates`).flush({ items });
    await settle();
  }

  it('shows each estimate with its number, members and newest issue, and leads into it', async () => {
    await open([estimate]);
    const row = element().querySelector('li a');
    expect(spoken(row)).toContain('2026-007-1, 12 members');
    expect(spoken(row)).toContain('issue B');
    expect(row?.getAttribute('href')).toBe(`/jobs/${job.id}/estimates/${estimate.id}/measure`);
  });

  it('leads the office to the price, and everybody to the bench sheets; neither begins anything', async () => {
    await open([estimate], ['office']);
    const links = [...element().querySelectorAll('li a')].map((link) => link.getAttribute('href')?.split('/').at(-1));
    expect(links).toEqual(['price', 'sheets']);
    expect(button('Begin another')).toBeUndefined();
  });

  it('leaves what follows a contract to where the contract stands', async () => {
    await open([estimate], ['estimator'], 'accepted');
    expect(button('Begin another')).toBeUndefined();
  });

  it('begins the first under the title of the job, once however often it is pressed', async () => {
    await open([]);
    const navigate = jest.spyOn(TestBed.inject(Router), 'navigate').mockResolvedValue(true);
    button('Begin the estimate')?.click();
    button('Begin the estimate')?.click();
    await settle();
    const begun = http.expectOne(
      ({ method, url }) => method === 'PUT' && url.startsWith(`/api/jobs/${job.id}/estimates/`),
    );
    expect(begun.request.body).toEqual({ title: 'Pier table' });
    begun.flush({ ...estimate, letter: null });
    await settle();
    expect(navigate.mock.calls[0][0]).toEqual(['/jobs', job.id, 'estimates', estimate.id, 'measure']);
  });

  it('begins the next with its number in the title, under the same id again where no answer came', async () => {
    await open([estimate]);
    const ids: string[] = [];
    for (let press = 0; press < 2; press++) {
      button('Begin another')?.click();
      await settle();
      const begun = http.expectOne(({ method }) => method === 'PUT');
      expect(begun.request.body).toEqual({ title: 'Pier table, 2' });
      ids.push(begun.request.url);
      begun.error(new ProgressEvent('error'));
      await settle();
    }
    expect(ids[1]).toBe(ids[0]);
  });
});
