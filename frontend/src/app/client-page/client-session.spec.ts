import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { words } from '../../test/sign-in';
import { Notices } from '../core/problems/notices';
import { Session } from '../core/session/session';
import { SESSION_PORT } from '../core/session/session-port';
import { ClientSession } from './client-session';

describe('ClientSession', () => {
  let session: ClientSession;
  let http: HttpTestingController;
  beforeEach(() => {
    TestBed.configureTestingModule({
      providers: [
        ...[words, provideHttpClient(), provideHttpClientTesting()],
        { provide: SESSION_PORT, useExisting: ClientSession },
      ],
    });
    session = TestBed.inject(ClientSession);
    http = TestBed.inject(HttpTestingController);
  });

  it('has the token that changing requests carry, and nobody signed in', async () => {
    const reading = session.read();
    http.expectOne('/api/session').flush({ token: 'token-of-a-visit', signedIn: null });
    await reading;
    const { requestToken, isSignedIn } = TestBed.inject(Session);
    expect([requestToken(), isSignedIn()]).toEqual(['token-of-a-visit', false]);
  });

  it('says that the server cannot be reached, and lets the page go on', async () => {
    const reading = session.read();
    http.expectOne('/api/session').error(new ProgressEvent('error'));
    await reading;
    expect(TestBed.inject(Notices).current()[0]?.isWrong).toBe(true);
  });

  it('cannot be begun again over the page', async () => {
    await expect(session.signInAgain()).resolves.toBe(false);
    expect(TestBed.inject(Session).isSignedIn()).toBe(false);
  });
});
