import { type Type } from '@angular/core';
import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { ActivatedRoute, Router, provideRouter } from '@angular/router';
import { factsOf, words } from '../../test/sign-in';
import { Notices } from '../core/problems/notices';
import { Session } from '../core/session/session';
import { SESSION_PORT } from '../core/session/session-port';
import { AccountsSession } from './accounts-session';
import { ForgottenPasswordPage } from './forgotten-password-page';
import { FoundPage } from './found-page';
import { NewPasswordPage } from './new-password-page';
import { NewWorkshopPage } from './new-workshop-page';

const token = 'a-token-of-a-mailed-link-of-at-least-40-characters';
const phrase = 'four plain words 1234';

describe('A stranger', () => {
  let http: HttpTestingController;
  let fixture: ComponentFixture<unknown>;
  let went: unknown[];
  const element = () => fixture.nativeElement as HTMLElement;
  const text = () => (element().textContent ?? '').replace(/\s+/g, ' ');
  const settle = async () => {
    await new Promise((resolve) => setTimeout(resolve));
    await fixture.whenStable();
  };

  async function open<T>(page: Type<T>, fragment: string | null = null): Promise<void> {
    TestBed.configureTestingModule({
      providers: [
        ...[words, provideRouter([]), provideHttpClient(), provideHttpClientTesting()],
        { provide: SESSION_PORT, useExisting: AccountsSession },
        { provide: ActivatedRoute, useValue: { snapshot: { fragment } } },
      ],
    });
    TestBed.inject(Session).put(undefined, 'token-of-the-session');
    http = TestBed.inject(HttpTestingController);
    went = [];
    jest.spyOn(TestBed.inject(Router), 'navigateByUrl').mockImplementation((url) => {
      went.push(url);
      return Promise.resolve(true);
    });
    fixture = TestBed.createComponent(page);
    await settle();
  }

  async function enter(selector: string, value: string): Promise<void> {
    const entry = element().querySelector<HTMLInputElement>(selector)!;
    entry.value = value;
    entry.dispatchEvent(new Event('input'));
    await settle();
  }

  async function submit(): Promise<void> {
    element().querySelector('form')!.dispatchEvent(new Event('submit'));
    await settle();
  }

  it('is told the same of a link on its way, whether the address is known or not', async () => {
    await open(ForgottenPasswordPage);
    await submit();
    expect(element().querySelector('[aria-invalid="true"]')).not.toBeNull();
    expect(text()).toContain('Please fill this in.');
    await enter('input[type=email]', 'Nobody@Mill.example');
    await submit();
    const asked = http.expectOne('/api/password-resets');
    expect(asked.request.body).toEqual({ email: 'nobody@mill.example' });
    asked.flush(null, { status: 204, statusText: 'No Content' });
    await settle();
    expect(text()).toContain('If nobody@mill.example is known here');
  });

  it('chooses a new password by the mailed link, and signs in with it', async () => {
    await open(NewPasswordPage, token);
    await enter('input', 'too short');
    await submit();
    http.expectNone('/api/password-resets/completion');
    expect(text()).toContain('At least 15 characters, please.');
    await enter('input', phrase);
    await submit();
    const asked = http.expectOne('/api/password-resets/completion');
    expect(asked.request.body).toEqual({ token, password: phrase });
    asked.flush(null, { status: 204, statusText: 'No Content' });
    await settle();
    expect(went).toEqual(['/sign-in']);
    expect(TestBed.inject(Notices).current()[0].text).toContain('Your new password is kept');
  });

  it.each([
    [NewPasswordPage, '/forgotten-password'],
    [FoundPage, '/new-workshop'],
  ])('without the secret of the link is shown the way to another (%p)', async (page, way) => {
    await open<unknown>(page);
    expect(element().querySelector('form')).toBeNull();
    expect(element().querySelector('p a')?.getAttribute('href')).toBe(way);
  });

  it('is told where a link is spent, beside the form', async () => {
    await open(FoundPage, token);
    await enter('input', phrase);
    await submit();
    const problem = { type: 'about:blank', title: 'This link has been used already.', status: 410, instance: '' };
    http
      .expectOne('/api/foundations/completion')
      .flush({ ...problem, errors: [] }, { status: 410, statusText: 'Gone' });
    await settle();
    expect(text()).toContain('This link has been used already.');
    expect(went).toEqual([]);
  });

  it('who founds a workshop is signed in and goes to work', async () => {
    await open(FoundPage, token);
    await enter('input', phrase);
    await submit();
    const signedIn = { ...factsOf(['owner']), workshop: { ...factsOf(['owner']).workshop, paperSize: 'A4' } };
    http.expectOne('/api/foundations/completion').flush({ token: 'another-token', signedIn });
    await settle();
    expect([TestBed.inject(Session).facts()?.name, went]).toEqual(['Imke Vale', ['/']]);
  });

  it('asks to found a workshop with the habits of where they are', async () => {
    await open(NewWorkshopPage);
    const names = [...element().querySelectorAll<HTMLSelectElement>('select')].map((one) => one.value);
    expect(names.every((value) => value !== '')).toBe(true);
    await submit();
    http.expectNone('/api/foundations');
    expect(element().querySelectorAll('[aria-invalid="true"]').length).toBeGreaterThanOrEqual(3);
  });

  it('goes with the country one chooses, but for what one chose oneself', async () => {
    await open(NewWorkshopPage);
    const choose = async (name: string, value: string) => {
      const select = element().querySelector<HTMLSelectElement>(`select[formControlName="${name}"]`)!;
      select.value = value;
      select.dispatchEvent(new Event('change'));
      await settle();
    };
    const habits = () =>
      ['locale', 'currency', 'lengthUnit', 'paperSize'].map(
        (name) => element().querySelector<HTMLSelectElement>(`[formControlName="${name}"]`)!.value,
      );
    await choose('country', 'JP');
    expect(habits()).toEqual(['ja-JP', 'JPY', 'mm', 'A4']);
    await choose('currency', 'CHF');
    await choose('country', 'US');
    expect(habits()).toEqual(['en-US', 'CHF', 'in', 'Letter']);
  });
});
