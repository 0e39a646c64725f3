import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import type { Client } from '#shared/jobs/client-schema';
import { signIn, words } from '../../test/sign-in';
import { SESSION_PORT } from '../core/session/session-port';
import { Confirm } from '../ui/dialog/confirm';
import { ClientPage } from './client-page';

const id = '018f0000-0000-7000-8000-000000000090';
const client: Client = {
  ...{
    id,
    version: 2,
    name: 'Ashgrove House',
    kind: 'institution',
    contact: 'Fenella Quarle',
    email: 'keeper@ashgrove.example',
  },
  ...{
    telephone: '',
    address: 'Long Lane\nWetherby',
    website: 'https://ashgrove.example',
    taxRegistration: '',
    note: '',
    jobs: 0,
  },
};

describe('ClientPage', () => {
  let fixture: ComponentFixture<ClientPage>;
  let http: HttpTestingController;
  let isSure = true;
  const element = () => fixture.nativeElement as HTMLElement;
  const settle = async () => {
    await new Promise((resolve) => setTimeout(resolve));
    TestBed.tick();
  };
  const button = (text: string) =>
    [...element().querySelectorAll('button')].find((one) => one.textContent?.trim() === text);
  const entry = (name: string) => element().querySelector<HTMLInputElement>(`[name=${name}]`) as HTMLInputElement;

  async function open(given: Client) {
    TestBed.configureTestingModule({
      providers: [
        ...[words, provideHttpClient(), provideHttpClientTesting(), { provide: SESSION_PORT, useValue: {} }],
        ...[provideRouter([]), { provide: Confirm, useValue: { ask: () => Promise.resolve(isSure) } }],
      ],
    });
    signIn(['office']);
    http = TestBed.inject(HttpTestingController);
    fixture = TestBed.createComponent(ClientPage);
    fixture.componentRef.setInput('clientId', id);
    TestBed.tick();
    await settle();
    http.expectOne(`/api/clients/${id}`).flush(given);
    await settle();
  }

  it('shows how to reach them', async () => {
    await open(client);
    const links = [...element().querySelectorAll('dl a')].map((link) => link.getAttribute('href'));
    expect(links).toEqual(['mailto:keeper@ashgrove.example', 'https://ashgrove.example']);
  });

  it('keeps a change on the version it shows', async () => {
    await open(client);
    button('Change the entry')?.click();
    await settle();
    entry('name').value = 'Ashgrove Hall';
    entry('name').dispatchEvent(new Event('input'));
    button('Keep the client')?.click();
    await settle();
    const request = http.expectOne({ method: 'PUT', url: `/api/clients/${id}` });
    expect([(request.request.body as Client).name, request.request.headers.get('if-match')]).toEqual([
      'Ashgrove Hall',
      '"2"',
    ]);
    request.flush({ ...client, version: 3, name: 'Ashgrove Hall' });
    await settle();
    expect(element().querySelector('h1')?.textContent).toBe('Ashgrove Hall');
  });

  it('says why an entry stays that jobs name', async () => {
    await open({ ...client, jobs: 2 });
    expect(button('Remove the client')).toBeUndefined();
    expect(element().textContent).toContain('While jobs name this client the entry stays.');
  });

  it('removes nobody without being sure', async () => {
    isSure = false;
    await open(client);
    button('Remove the client')?.click();
    await settle();
    http.expectNone({ method: 'DELETE', url: `/api/clients/${id}` });
    isSure = true;
  });
});
