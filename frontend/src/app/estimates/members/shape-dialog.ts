import { ChangeDetectionStrategy, Component, type Injector, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import {
  MatDialog,
  MatDialogActions,
  MatDialogClose,
  MatDialogContent,
  MatDialogRef,
  MatDialogTitle,
} from '@angular/material/dialog';
import { firstValueFrom } from 'rxjs';
import type { Shape, ShapeKind } from '#shared/measure/shape';
import { Formats } from '../../core/formats/formats';
import { firstShape, ShapeCards, shapeNames } from '../../measure';

/** Asks which shape a new member has. */
@Component({
  selector: 'app-shape-dialog',
  imports: [MatButton, MatDialogActions, MatDialogClose, MatDialogContent, MatDialogTitle, ShapeCards],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h2 mat-dialog-title i18n>What shape is it?</h2>
    <mat-dialog-content><app-shape-cards (picked)="take($event)" /></mat-dialog-content>
    <mat-dialog-actions align="end">
      <button matButton type="button" mat-dialog-close i18n>Not now</button>
    </mat-dialog-actions>
  `,
})
export class ShapeDialog {
  private readonly reference = inject<MatDialogRef<ShapeDialog, ShapeKind>>(MatDialogRef);

  protected take(kind: ShapeKind): void {
    this.reference.close(kind);
  }
}

/** The shape somebody chooses with its name, or undefined where they would rather not. */
export async function askForShape(injector: Injector): Promise<{ shape: Shape; name: string } | undefined> {
  const asked = injector.get(MatDialog).open<ShapeDialog, undefined, ShapeKind>(ShapeDialog, { width: '760px' });
  const kind = await firstValueFrom(asked.afterClosed());
  return kind && { shape: firstShape(kind, injector.get(Formats).lengthUnit()), name: shapeNames[kind] };
}
