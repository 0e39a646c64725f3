import { Injectable, computed, inject, signal } from '@angular/core';
import { NOW } from '../now';

export type SavingState = 'idle' | 'saving' | 'kept' | 'waiting' | 'failed';

/** What the page says about work on its way to the server; whoever saves writes here, the indicator and the leave guard read. */
@Injectable({ providedIn: 'root' })
export class Saving {
  private readonly now = inject(NOW);
  private readonly phase = signal<SavingState>('idle');
  private readonly keptMoment = signal<Date | undefined>(undefined);
  private readonly unsent = signal(0);

  readonly state = this.phase.asReadonly();
  readonly keptAt = this.keptMoment.asReadonly();
  /** Something was typed that the server does not have yet. */
  readonly hasUnsent = computed(() => this.unsent() > 0 || this.phase() === 'saving');

  /** How many changes wait to be sent; they live in memory only. */
  expect(count: number): void {
    this.unsent.set(count);
  }

  begin(): void {
    this.phase.set('saving');
  }

  kept(): void {
    this.keptMoment.set(this.now());
    this.phase.set('kept');
  }

  /** The server is away; it will be tried again. */
  wait(): void {
    this.phase.set('waiting');
  }

  /** It was refused and somebody must look at it. */
  fail(): void {
    this.phase.set('failed');
  }

  /** Forgets all of it, for another page. */
  reset(): void {
    this.phase.set('idle');
    this.keptMoment.set(undefined);
    this.unsent.set(0);
  }
}
