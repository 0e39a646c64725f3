import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatDialog } from '@angular/material/dialog';
import { of } from 'rxjs';
import type { Client } from '#shared/jobs/client-schema';
import { signIn, words } from '../../test/sign-in';
import { SESSION_PORT } from '../core/session/session-port';
import { ClientField } from './client-field';

const client = (number: number, name: string): Client => ({
  ...{ id: `018f0000-0000-7000-8000-0000000000${number}`, version: 1, name, kind: 'firm', contact: '', email: '' },
  ...{ telephone: '', address: '', website: '', taxRegistration: '', note: '', jobs: 0 },
});
const [ashgrove, corvo, pike] = [client(91, 'Ashgrove House'), client(92, 'Corvo'), client(93, 'Marigold Pike')];

@Component({
  selector: 'app-form-around',
  imports: [ClientField, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<app-client-field i18n-label label="Client" mayEnter [formControl]="control" />`,
})
class FormAround {
  readonly control = new FormControl<string | null>(null);
}

describe('ClientField', () => {
  let fixture: ComponentFixture<FormAround>;
  let http: HttpTestingController;
  const asked: unknown[] = [];
  const control = () => fixture.componentInstance.control;
  const entry = () => (fixture.nativeElement as HTMLElement).querySelector('input') as HTMLInputElement;
  const options = () => [...document.querySelectorAll('mat-option')].map((option) => option.textContent?.trim());
  const settle = async (time_ms = 0) => {
    await new Promise((resolve) => setTimeout(resolve, time_ms));
    TestBed.tick();
  };
  const press = async (key: string, keyCode: number) => {
    entry().dispatchEvent(new KeyboardEvent('keydown', { key, keyCode, bubbles: true }));
    await settle();
  };
  const answer = async (items: readonly Client[]) => {
    await settle(250);
    http
      .expectOne(({ url }) => url.startsWith('/api/clients?'))
      .flush({ items, next: null, count: items.length, countIsExact: true });
    await settle();
    // The list chooses which of the new options Enter takes a moment after they are there.
    await settle();
  };
  const type = async (text: string) => {
    entry().focus();
    entry().value = text;
    entry().dispatchEvent(new Event('input'));
    await settle();
  };

  beforeEach(() => {
    asked.splice(0);
    const dialog = {
      open: (_dialog: unknown, { data }: { data: string }) => (asked.push(data), { afterClosed: () => of(pike) }),
    };
    TestBed.configureTestingModule({
      providers: [
        ...[words, provideHttpClient(), provideHttpClientTesting(), { provide: SESSION_PORT, useValue: {} }],
        { provide: MatDialog, useValue: dialog },
      ],
    });
    signIn(['owner']);
    http = TestBed.inject(HttpTestingController);
    fixture = TestBed.createComponent(FormAround);
    document.body.append(fixture.nativeElement as HTMLElement);
    TestBed.tick();
  });
  afterEach(() => (fixture.nativeElement as HTMLElement).remove());

  it('takes the first who was found with Enter', async () => {
    await type('corv');
    await answer([corvo]);
    await press('Enter', 13);
    expect([control().value, entry().value]).toEqual([corvo.id, 'Corvo']);
  });

  it('offers nobody from an earlier search who is plainly not meant', async () => {
    await type('');
    await answer([ashgrove, corvo]);
    await type('marigold');
    expect(options()).toEqual(['Enter “marigold” as a new client']);
    await press('Enter', 13);
    expect(control().value).not.toBe(ashgrove.id);
  });

  it('has somebody new entered on the spot, and takes them', async () => {
    await type('Marigold Pike');
    await answer([]);
    await press('Enter', 13);
    await settle();
    expect(asked).toEqual(['Marigold Pike']);
    expect([control().value, entry().value]).toEqual([pike.id, 'Marigold Pike']);
  });

  it('leaves a chosen client as they are when Enter is pressed over the list', async () => {
    await type('corv');
    await answer([corvo]);
    await press('Enter', 13);
    entry().blur();
    entry().focus();
    await answer([ashgrove, corvo]);
    await press('Enter', 13);
    expect(control().value).toBe(corvo.id);
  });

  it('forgets the client as soon as another text is typed', async () => {
    await type('corv');
    await answer([corvo]);
    await press('Enter', 13);
    await type('Corvo & Sons');
    expect(control().value).toBeNull();
  });

  it('shows by name whom the form names', async () => {
    control().setValue(ashgrove.id);
    await settle();
    http.expectOne(`/api/clients/${ashgrove.id}`).flush(ashgrove);
    await settle();
    expect(entry().value).toBe('Ashgrove House');
  });
});
