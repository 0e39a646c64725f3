import { DOCUMENT, Injectable, inject } from '@angular/core';

/** Begins again with a fresh page, so that nothing of one person or workshop stays in memory for the next. */
@Injectable({ providedIn: 'root' })
export class FreshPage {
  private readonly document = inject(DOCUMENT);

  open(path: string): void {
    this.document.defaultView?.location.assign(path);
  }
}
