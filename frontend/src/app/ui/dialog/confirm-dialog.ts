import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import {
  MAT_DIALOG_DATA,
  MatDialogActions,
  MatDialogClose,
  MatDialogContent,
  MatDialogTitle,
} from '@angular/material/dialog';

/** What would be lost, and the words of the button that does it. */
export interface ConfirmQuestion {
  readonly heading: string;
  readonly text: string;
  readonly yes: string;
}

/** Asked only where something would be lost for good; everything else is undone afterwards instead. */
@Component({
  selector: 'app-confirm-dialog',
  imports: [MatButton, MatDialogActions, MatDialogClose, MatDialogContent, MatDialogTitle],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h2 mat-dialog-title>{{ question.heading }}</h2>
    <mat-dialog-content>
      <p>{{ question.text }}</p>
    </mat-dialog-content>
    <mat-dialog-actions align="end">
      <button matButton type="button" [mat-dialog-close]="false" cdkFocusInitial i18n>Leave it as it is</button>
      <button matButton="filled" type="button" [mat-dialog-close]="true">{{ question.yes }}</button>
    </mat-dialog-actions>
  `,
})
export class ConfirmDialog {
  protected readonly question = inject<ConfirmQuestion>(MAT_DIALOG_DATA);
}
