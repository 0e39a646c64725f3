import { Injectable, signal } from '@angular/core';

/** Something said in passing, with at most one thing to do about it. */
export interface Notice {
  readonly id: number;
  readonly text: string;
  readonly isWrong: boolean;
  readonly action?: { readonly label: string; readonly run: () => void };
}

const shown_ms = 6000;
const actionShown_ms = 12000;

/** Keeps what is being said in passing; `app-notices` of the shell shows it. */
@Injectable({ providedIn: 'root' })
export class Notices {
  private readonly list = signal<readonly Notice[]>([]);
  private count = 0;

  readonly current = this.list.asReadonly();

  /** Says that something went well, or offers to undo it. */
  say(text: string, action?: Notice['action']): void {
    this.show(
      { id: ++this.count, text, isWrong: false, ...(action ? { action } : {}) },
      action ? actionShown_ms : shown_ms,
    );
  }

  /** Says that something went wrong; it stays until it is closed. */
  complain(text: string): void {
    if (this.list().some((notice) => notice.text === text)) return;
    this.show({ id: ++this.count, text, isWrong: true });
  }

  close(id: number): void {
    this.list.update((list) => list.filter((notice) => notice.id !== id));
  }

  private show(notice: Notice, time_ms?: number): void {
    this.list.update((list) => [...list.slice(-2), notice]);
    if (time_ms) setTimeout(() => this.close(notice.id), time_ms);
  }
}
