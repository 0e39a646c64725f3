import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import type { Workshop } from '#shared/accounts/workshop-schema';
import { factsOf, signIn, words } from '../../test/sign-in';
import { SESSION_PORT } from '../core/session/session-port';
import { AccountsSession } from './accounts-session';
import { WorkshopPage } from './workshop-page';

const id = (number: number) => `018f0000-0000-7000-8000-0000000000${number}`;
const workshop: Workshop = {
  ...{ id: id(31), version: 3, logoFileId: null, name: 'Mill Yard Carvers', country: 'IE', currency: 'EUR' },
  ...{ locale: 'en-IE', lengthUnit: 'mm', timeZone: 'Europe/Dublin', paperSize: 'A4' },
  ...{ addressLines: ['Mill Yard', 'Dunmara'], telephone: '', email: '', taxRegistration: '', defaultTaxCategory: 'S' },
};

describe('WorkshopPage', () => {
  let http: HttpTestingController;
  let fixture: ComponentFixture<WorkshopPage>;
  const element = () => fixture.nativeElement as HTMLElement;
  const text = () => (element().textContent ?? '').replace(/\s+/g, ' ');
  const settle = async () => {
    await new Promise((resolve) => setTimeout(resolve));
    await fixture.whenStable();
  };
  const button = (name: string) =>
    [...element().querySelectorAll('button')].find((one) => one.textContent?.trim() === name) as HTMLButtonElement;

  beforeEach(async () => {
    TestBed.configureTestingModule({
      providers: [
        ...[words, provideHttpClient(), provideHttpClientTesting()],
        { provide: SESSION_PORT, useExisting: AccountsSession },
      ],
    });
    signIn(['owner']);
    http = TestBed.inject(HttpTestingController);
    fixture = TestBed.createComponent(WorkshopPage);
    TestBed.tick();
    http.expectOne('/api/workshop').flush(workshop);
    await settle();
  });

  async function enter(name: string, value: string): Promise<void> {
    const entry = element().querySelector<HTMLInputElement>(`[formcontrolname=${name}]`)!;
    entry.value = value;
    entry.dispatchEvent(new Event('input'));
    await settle();
  }

  it('keeps the settings from the version that was read, and writes figures by them from then on', async () => {
    await enter('telephone', '+353 1 555 0100');
    button('Keep the settings').click();
    await settle();
    const kept = http.expectOne({ method: 'PUT', url: '/api/workshop' });
    const { id: _id, version: _version, logoFileId: _logo, ...settings } = workshop;
    expect(kept.request.body).toEqual({ ...settings, telephone: '+353 1 555 0100' });
    expect(kept.request.headers.get('if-match')).toBe('"3"');
    kept.flush({ ...workshop, version: 4, telephone: '+353 1 555 0100' });
    await settle();
    const facts = factsOf(['owner']);
    http
      .expectOne('/api/session')
      .flush({ token: 'token', signedIn: { ...facts, workshop: { ...facts.workshop, paperSize: 'A4' } } });
    await settle();
    expect(element().querySelector<HTMLInputElement>('[formcontrolname=telephone]')?.value).toBe('+353 1 555 0100');
  });

  it('sends no address that is none, and says so beside it', async () => {
    await enter('email', 'desk at mill');
    button('Keep the settings').click();
    await settle();
    http.expectNone({ method: 'PUT', url: '/api/workshop' });
    expect(text()).toContain('This does not look like an e-mail address.');
  });

  it('puts a picture on the letterhead, says what is wrong with one, and takes it off again', async () => {
    const choose = async (name: string) => {
      const entry = element().querySelector<HTMLInputElement>('input[type=file]')!;
      const file = new File(['picture'], name, { type: 'image/png' });
      Object.defineProperty(entry, 'files', { value: { item: () => file }, configurable: true });
      entry.dispatchEvent(new Event('change'));
      await settle();
      return http.expectOne({ method: 'PUT', url: '/api/workshop/logo' });
    };
    const problem = { type: 'about:blank', title: 'This is no picture.', status: 415, instance: '', errors: [] };
    (await choose('song.png')).flush(problem, { status: 415, statusText: 'Unsupported' });
    await settle();
    expect(element().querySelector('app-logo-entry [role=alert]')?.textContent).toContain('This is no picture.');
    const sent = await choose('mark.png');
    expect([sent.request.body instanceof FormData, sent.request.headers.get('if-match')]).toEqual([true, '"3"']);
    sent.flush({ ...workshop, version: 4, logoFileId: id(41) });
    await settle();
    expect(element().querySelector('app-logo-entry img')?.getAttribute('src')).toBe(
      `/api/workshop/logo?file=${id(41)}`,
    );
    button('Take it off').click();
    await settle();
    const taken = http.expectOne({ method: 'DELETE', url: '/api/workshop/logo' });
    expect(taken.request.headers.get('if-match')).toBe('"4"');
    taken.flush({ ...workshop, version: 5 });
    await settle();
    expect(element().querySelector('app-logo-entry img')).toBeNull();
  });
});
