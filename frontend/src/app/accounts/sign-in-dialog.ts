import { ChangeDetectionStrategy, Component, type Injector, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import {
  MAT_DIALOG_DATA,
  MatDialog,
  MatDialogClose,
  MatDialogContent,
  MatDialogRef,
  MatDialogTitle,
} from '@angular/material/dialog';
import { firstValueFrom } from 'rxjs';
import type { SessionAnswer } from '#shared/accounts/session-schema';
import { SignInForm } from './sign-in-form';

/** Signing in over the page as it stands, so that nothing typed is lost when a session ends. */
@Component({
  selector: 'app-sign-in-dialog',
  imports: [MatButton, MatDialogClose, MatDialogContent, MatDialogTitle, SignInForm],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h2 mat-dialog-title i18n>Please sign in again</h2>
    <mat-dialog-content>
      <p class="muted" i18n>The session has ended. Your entries are still here and go on as soon as you are back.</p>
      <app-sign-in-form [fixedEmail]="email" (signedIn)="reference.close($event)">
        <button matButton type="button" mat-dialog-close i18n>Not now</button>
      </app-sign-in-form>
    </mat-dialog-content>
  `,
  styles: `
    mat-dialog-content {
      display: grid;
      gap: 16px;
    }
  `,
})
export class SignInDialog {
  protected readonly email = inject<string>(MAT_DIALOG_DATA);
  protected readonly reference = inject<MatDialogRef<SignInDialog, SessionAnswer>>(MatDialogRef);
}

/** Opens the dialog for one person; undefined when they would rather not. */
export async function askForSignIn(injector: Injector, email: string): Promise<SessionAnswer | undefined> {
  // Who it is stands fixed; one begins at what is to be typed.
  const settings = { data: email, width: '480px', disableClose: true, autoFocus: 'input:not([readonly])' };
  const dialog = injector.get(MatDialog).open<SignInDialog, string, SessionAnswer>(SignInDialog, settings);
  return firstValueFrom(dialog.afterClosed());
}
