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
import { type FieldChange, fieldChanges } from '#shared/audit/field-changes';
import { FieldWords } from '../../audit';
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
  private readonly words = inject(FieldWords);
  protected readonly conflict = inject<Conflict>(MAT_DIALOG_DATA);

  protected readonly name = computed(() => {
    const content = this.conflict.mine.content ?? this.conflict.theirs;
    if (!content) return '';
    return 'name' in content ? content.name : content.title;
  });
  protected readonly differences = computed(() =>
    fieldChanges(this.conflict.mine.content, this.conflict.theirs).map((change) => {
      const { label, before, after } = this.words.of(change);
      const [mine, theirs] = sides[change.what] ?? [before, after];
      return { label, mine, theirs };
    }),
  );
}

/** What stands on either side where there are no two values to show. */
const sides: Readonly<Partial<Record<FieldChange['what'], readonly [string, string]>>> = {
  added: ['–', $localize`is there`],
  removed: [$localize`is there`, '–'],
  moved: [$localize`in your order`, $localize`in their order`],
};

/** Asks until one side is chosen: closing the dialog is no answer. */
export async function askWhichSide(injector: Injector, conflict: Conflict): Promise<Side> {
  const asked = injector
    .get(MatDialog)
    .open<StaleDialog, Conflict, Side>(StaleDialog, { data: conflict, width: '640px', disableClose: true });
  return (await firstValueFrom(asked.afterClosed())) ?? 'theirs';
}
