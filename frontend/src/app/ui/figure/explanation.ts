import { Injectable, signal } from '@angular/core';
import type { Explained } from './explained';

/** Which figure of the page is explaining itself; figures write here, the reason panel reads. */
@Injectable({ providedIn: 'root' })
export class Explanation {
  private readonly shown = signal<Explained | undefined>(undefined);

  readonly current = this.shown.asReadonly();

  isOf(id: string): boolean {
    return this.shown()?.id === id;
  }

  show(explained: Explained): void {
    this.shown.set(explained);
  }

  close(): void {
    this.shown.set(undefined);
  }
}
