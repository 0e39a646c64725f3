import { Injectable, signal } from '@angular/core';

/** The day a kept programme offers, as soon as somebody who read it has told; it stays known as long as the estimate is open. */
@Injectable()
export class ReadyDay {
  private readonly told = signal<string | undefined>(undefined);

  readonly day = this.told.asReadonly();

  tell(day: string | undefined): void {
    this.told.set(day);
  }
}
