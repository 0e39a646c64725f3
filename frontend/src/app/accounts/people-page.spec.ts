import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import type { Role } from '#shared/actor/role';
import { factsOf, signIn, words } from '../../test/sign-in';
import { Notices } from '../core/problems/notices';
import { SESSION_PORT } from '../core/session/session-port';
import { PeoplePage } from './people-page';

const id = (number: number) => `018f0000-0000-7000-8000-0000000000${number}`;
const colleague = {
  membershipId: id(21),
  accountId: id(22),
  name: 'Orla Kinsella',
  roles: ['bench'],
  isDisabled: false,
};
const person = { ...colleague, email: 'orla@mill.example', joinedAt: '2026-01-02T10:00:00.000Z', version: 3 };

describe('PeoplePage', () => {
  let fixture: ComponentFixture<PeoplePage>;
  let http: HttpTestingController;
  const element = () => fixture.nativeElement as HTMLElement;
  const settle = async () => {
    await new Promise((resolve) => setTimeout(resolve));
    await fixture.whenStable();
  };
  const button = (text: string) =>
    [...element().querySelectorAll('button')].find((one) => one.textContent?.trim() === text);

  async function open(roles: readonly Role[], items: unknown[]) {
    TestBed.configureTestingModule({
      providers: [words, provideHttpClient(), provideHttpClientTesting(), { provide: SESSION_PORT, useValue: {} }],
    });
    signIn(roles);
    http = TestBed.inject(HttpTestingController);
    fixture = TestBed.createComponent(PeoplePage);
    TestBed.tick();
    http.expectOne('/api/people').flush({ items });
    http.match('/api/invitations').forEach((request) => request.flush({ items: [] }));
    await settle();
  }

  it('shows colleagues to everybody, and lets nobody but an owner change anything', async () => {
    await open(['bench'], [colleague]);
    expect(element().textContent).toContain('Orla Kinsella');
    expect(element().querySelectorAll('button')).toHaveLength(0);
    http.expectNone('/api/invitations');
  });

  it('ends access at once and offers to undo it, from the version that ending made', async () => {
    await open(['owner'], [person]);
    button('End access')?.click();
    await settle();
    const ending = http.expectOne({ method: 'PUT', url: `/api/people/${id(21)}/access` });
    expect([ending.request.body, ending.request.headers.get('if-match')]).toEqual([{ isDisabled: true }, '"3"']);
    ending.flush({ ...person, isDisabled: true, version: 4 });
    await settle();
    expect(element().textContent).toContain('no access');
    TestBed.inject(Notices).current()[0].action?.run();
    await settle();
    const undoing = http.expectOne({ method: 'PUT', url: `/api/people/${id(21)}/access` });
    expect([undoing.request.body, undoing.request.headers.get('if-match')]).toEqual([{ isDisabled: false }, '"4"']);
    undoing.flush({ ...person, version: 5 });
  });

  it('lets an owner not shut themselves out', async () => {
    const facts = factsOf(['owner']);
    await open(['owner'], [{ ...person, accountId: facts.accountId }]);
    expect(button('End access')).toBeUndefined();
    expect(button('Change roles')).toBeDefined();
  });

  it('sends an invitation again under the same key until it went out', async () => {
    await open(['owner'], [person]);
    button('Invite somebody')?.click();
    await settle();
    const [name, email] = element().querySelectorAll<HTMLInputElement>('app-invite-form input[appentry]');
    [name.value, email.value] = ['Maren Holt', 'maren@holt.example'];
    [name, email].forEach((entry) => entry.dispatchEvent(new Event('input')));
    element().querySelectorAll<HTMLInputElement>('app-role-choice input')[2].click();
    const send = async () => {
      button('Send the invitation')?.click();
      await settle();
      return http.expectOne({ method: 'POST', url: '/api/invitations' });
    };
    const first = await send();
    first.error(new ProgressEvent('error'));
    await settle();
    const second = await send();
    expect(second.request.headers.get('idempotency-key')).toBe(first.request.headers.get('idempotency-key'));
    expect(second.request.body).toEqual({ name: 'Maren Holt', email: 'maren@holt.example', roles: ['bench'] });
  });
});
