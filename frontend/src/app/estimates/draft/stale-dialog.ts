import { ChangeDetectionStrategy, Component, type Injector, computed, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import {
  MAT_DIALOG_DATA,
  MatDialog,
  MatDialogActions,
  MatDialogClose,
  MatDialogContent,
  MatDialogTitle,
} from '@angular/material/dialog';
import { firstValueFrom } from 'rxjs';
import { Formats } from '../../core/formats/formats';
import { sideDifferences } from './side-differences';
import type { Conflict, Side } from './conflict';

/** Two people changed one thing: both sides beside each other, and which is to stand. */
@Component({
  selector: 'app-stale-dialog',
  imports: [MatButton, MatDialogActions, MatDialogClose, MatDialogContent, MatDialogTitle],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './stale-dialog.html',
  styleUrl: './stale-dialog.scss',
})
export class StaleDialog {
  private readonly formats = inject(Formats);
  protected readonly conflict = inject<Conflict>(MAT_DIALOG_DATA);

  protected readonly name = computed(() => {
    const content = this.conflict.mine.content ?? this.conflict.theirs;
    if (!content) return '';
    return 'name' in content ? content.name : content.title;
  });
  protected readonly differences = computed(() =>
    sideDifferences(this.conflict.mine.content, this.conflict.theirs, this.formats),
  );
}

/** Asks until one side is chosen: closing the dialog is no answer. */
export async function askWhichSide(injector: Injector, conflict: Conflict): Promise<Side> {
  const asked = injector
    .get(MatDialog)
    .open<StaleDialog, Conflict, Side>(StaleDialog, { data: conflict, width: '640px', disableClose: true });
  return (await firstValueFrom(asked.afterClosed())) ?? 'theirs';
}
