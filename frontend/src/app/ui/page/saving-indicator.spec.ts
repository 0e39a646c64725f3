import { TestBed } from '@angular/core/testing';
import { words, signIn } from '../../../test/sign-in';
import { SavingIndicator } from './saving-indicator';
import { NOW } from '../../core/now';
import { Saving } from '../../core/saving/saving';

describe('What is said of saving', () => {
  beforeEach(() =>
    TestBed.configureTestingModule({
      providers: [words, { provide: NOW, useValue: () => new Date('2026-05-07T13:02:00Z') }],
    }),
  );

  it('has something unsent from the first key until the server has it', () => {
    const saving = TestBed.inject(Saving);
    expect(saving.hasUnsent()).toBe(false);
    saving.expect(1);
    saving.begin();
    saving.expect(0);
    expect(saving.hasUnsent()).toBe(true);
    saving.kept();
    expect(saving.hasUnsent()).toBe(false);
  });

  it('is said with the time of the workshop', async () => {
    signIn(['owner'], { timeZone: 'Europe/Dublin' });
    const fixture = TestBed.createComponent(SavingIndicator);
    TestBed.inject(Saving).kept();
    await fixture.whenStable();
    expect((fixture.nativeElement as HTMLElement).textContent?.trim()).toBe('kept 14:02');
  });

  it('holds a tab that would lose something', () => {
    TestBed.createComponent(SavingIndicator);
    const leave = () => {
      const event = new Event('beforeunload', { cancelable: true });
      globalThis.dispatchEvent(event);
      return event.defaultPrevented;
    };
    expect(leave()).toBe(false);
    TestBed.inject(Saving).expect(2);
    expect(leave()).toBe(true);
  });
});
