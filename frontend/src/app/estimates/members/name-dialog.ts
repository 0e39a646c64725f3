import { ChangeDetectionStrategy, Component, type Injector, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import {
  MAT_DIALOG_DATA,
  MatDialog,
  MatDialogActions,
  MatDialogClose,
  MatDialogContent,
  MatDialogRef,
  MatDialogTitle,
} from '@angular/material/dialog';
import { firstValueFrom } from 'rxjs';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';

interface NameQuestion {
  readonly label: string;
  readonly name: string;
}

const longest = 120;

/** Asks for one name. */
@Component({
  selector: 'app-name-dialog',
  imports: [Entry, Field, MatButton, MatDialogActions, MatDialogClose, MatDialogContent, MatDialogTitle],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h2 mat-dialog-title>{{ question.label }}</h2>
    <form (submit)="take($event)">
      <mat-dialog-content>
        <app-field [label]="question.label" [labelHidden]="true">
          <input
            #entry
            appEntry
            cdkFocusInitial
            [maxLength]="longest"
            [value]="name()"
            (input)="name.set(entry.value)"
          />
        </app-field>
      </mat-dialog-content>
      <mat-dialog-actions align="end">
        <button matButton type="button" mat-dialog-close i18n>Leave it as it is</button>
        <button matButton="filled" type="submit" [disabled]="!name().trim()" i18n>Keep</button>
      </mat-dialog-actions>
    </form>
  `,
})
export class NameDialog {
  private readonly reference = inject<MatDialogRef<NameDialog, string>>(MatDialogRef);
  protected readonly question = inject<NameQuestion>(MAT_DIALOG_DATA);
  protected readonly name = signal(this.question.name);
  protected readonly longest = longest;

  protected take(event: Event): void {
    event.preventDefault();
    if (this.name().trim()) this.reference.close(this.name().trim());
  }
}

/** The name somebody gives, or undefined where they would rather not. */
export function askForName(injector: Injector, label: string, name: string): Promise<string | undefined> {
  const asked = injector
    .get(MatDialog)
    .open<NameDialog, NameQuestion, string>(NameDialog, { data: { label, name }, width: '440px' });
  return firstValueFrom(asked.afterClosed());
}
