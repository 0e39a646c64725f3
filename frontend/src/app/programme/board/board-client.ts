import { Injectable, inject } from '@angular/core';
import { readBoard } from '#shared/programme/board-endpoints';
import { Api } from '../../core/api/api';

/** The calls of the board. */
@Injectable({ providedIn: 'root' })
export class BoardClient {
  private readonly api = inject(Api);

  read(asked: { readonly from?: string; readonly weeks: number }, signal: AbortSignal) {
    return this.api.call(readBoard, { query: asked, signal });
  }
}
