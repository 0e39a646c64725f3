import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MAT_DIALOG_DATA, MatDialogContent, MatDialogRef, MatDialogTitle } from '@angular/material/dialog';
import type { Client } from '#shared/jobs/client-schema';
import { ClientForm } from './client-form';

/** Enters a client without leaving the job one is about to open. */
@Component({
  selector: 'app-client-dialog',
  imports: [ClientForm, MatDialogContent, MatDialogTitle],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h2 mat-dialog-title i18n>A new client</h2>
    <mat-dialog-content>
      <app-client-form brief [name]="name" (kept)="dialog.close($event)" (closed)="dialog.close()" />
    </mat-dialog-content>
  `,
})
export class ClientDialog {
  protected readonly name = inject<string>(MAT_DIALOG_DATA);
  protected readonly dialog = inject<MatDialogRef<ClientDialog, Client>>(MatDialogRef);
}
