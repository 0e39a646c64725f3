import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MatDialogHarness } from '@angular/material/dialog/testing';
import { factsOf, signIn, words } from '../../test/sign-in';
import { FreshPage } from '../core/routing/fresh-page';
import { Session } from '../core/session/session';
import { SESSION_PORT } from '../core/session/session-port';
import { AccountsSession } from './accounts-session';

@Component({ selector: 'app-test-page', changeDetection: ChangeDetectionStrategy.OnPush, template: '' })
class TestPage {}

const answerOf = (signedIn: unknown, token = 'token-of-a-new-session') => ({ token, signedIn });
const full = () => {
  const facts = factsOf(['owner']);
  return { ...facts, workshop: { ...facts.workshop, paperSize: 'A4' } };
};

describe('AccountsSession', () => {
  let accounts: AccountsSession;
  let http: HttpTestingController;
  const opened: string[] = [];
  const settle = () => new Promise((resolve) => setTimeout(resolve, 20));

  beforeEach(() => {
    opened.length = 0;
    TestBed.configureTestingModule({
      providers: [
        words,
        provideHttpClient(),
        provideHttpClientTesting(),
        { provide: SESSION_PORT, useExisting: AccountsSession },
        { provide: FreshPage, useValue: { open: (path: string) => opened.push(path) } },
      ],
    });
    accounts = TestBed.inject(AccountsSession);
    http = TestBed.inject(HttpTestingController);
  });

  it('reads who is signed in, and the token of their session', async () => {
    const reading = accounts.read();
    http.expectOne('/api/session').flush(answerOf(full()));
    await reading;
    const session = TestBed.inject(Session);
    expect([session.facts()?.name, session.requestToken(), session.audience()]).toEqual([
      'Imke Vale',
      'token-of-a-new-session',
      'cost',
    ]);
  });

  it('leaves nothing of one person in memory for the next', async () => {
    signIn();
    const leaving = accounts.signOut();
    http.expectOne({ method: 'DELETE', url: '/api/session' }).flush(null);
    await leaving;
    expect(opened).toEqual(['/sign-in']);
  });

  it('asks for no password while the session of the same person still stands', async () => {
    signIn();
    const again = accounts.signInAgain();
    http.expectOne('/api/session').flush(answerOf(full()));
    await expect(again).resolves.toBe(true);
    expect(TestBed.inject(Session).requestToken()).toBe('token-of-a-new-session');
  });

  it('goes back to the workshop the page is of, when signing in led to another', async () => {
    signIn();
    const elsewhere = {
      ...full(),
      membership: { id: '018f0000-0000-7000-8000-000000000077', workshopName: 'Harbour Street', roles: ['bench'] },
    };
    const again = accounts.signInAgain();
    http.expectOne('/api/session').flush(answerOf(elsewhere));
    await settle();
    const entering = http.expectOne({ method: 'PUT', url: '/api/session/membership' });
    expect(entering.request.body).toEqual({ membershipId: factsOf(['owner']).membership?.id });
    entering.flush(answerOf(full()));
    await expect(again).resolves.toBe(true);
  });

  it('asks for the password of the same person over the page once the session is gone', async () => {
    signIn();
    const loader = TestbedHarnessEnvironment.documentRootLoader(TestBed.createComponent(TestPage));
    const again = accounts.signInAgain();
    http.expectOne('/api/session').flush(answerOf(null, 'token-of-a-stranger'));
    await settle();
    await loader.getHarness(MatDialogHarness);
    const [email, password] = document.querySelectorAll<HTMLInputElement>('mat-dialog-container input');
    expect([email.value, email.readOnly]).toEqual(['imke@vale.example', true]);
    password.value = 'four words of our own';
    password.dispatchEvent(new Event('input'));
    document.querySelector<HTMLButtonElement>('mat-dialog-container button[type=submit]')?.click();
    await settle();
    const sent = http.expectOne({ method: 'POST', url: '/api/session' });
    expect([sent.request.headers.get('x-csrf-token'), sent.request.body]).toEqual([
      'token-of-a-stranger',
      { email: 'imke@vale.example', password: 'four words of our own' },
    ]);
    sent.flush(answerOf(full()));
    await expect(again).resolves.toBe(true);
  });
});
