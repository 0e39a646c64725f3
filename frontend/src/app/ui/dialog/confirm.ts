import { Injectable, inject } from '@angular/core';
import { MatDialog } from '@angular/material/dialog';
import { firstValueFrom } from 'rxjs';
import { ConfirmDialog, type ConfirmQuestion } from './confirm-dialog';

/** Asks before something is lost for good. */
@Injectable({ providedIn: 'root' })
export class Confirm {
  private readonly dialog = inject(MatDialog);

  /** True when the person said yes; closing it any other way is no. */
  async ask(question: ConfirmQuestion): Promise<boolean> {
    const asked = this.dialog.open<ConfirmDialog, ConfirmQuestion, boolean>(ConfirmDialog, {
      data: question,
      width: '480px',
    });
    return (await firstValueFrom(asked.afterClosed())) === true;
  }
}
