import { ChangeDetectionStrategy, Component, type Injector, computed, inject, signal } from '@angular/core';
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
import type { ZoneRow } from './zone-row';
import type { SpreadGroup, SpreadTarget } from './zone-spread';

/** What is asked: whose build-up, and on what it may be laid. */
interface SpreadQuestion {
  readonly row: ZoneRow;
  readonly groups: readonly SpreadGroup[];
}

/** Asks on which other zones a build-up is laid too. */
@Component({
  selector: 'app-spread-dialog',
  imports: [MatButton, MatDialogActions, MatDialogClose, MatDialogContent, MatDialogTitle],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './spread-dialog.html',
  styles: `
    fieldset + fieldset {
      margin-top: 12px;
    }
  `,
})
export class SpreadDialog {
  private readonly reference = inject<MatDialogRef<SpreadDialog, readonly SpreadTarget[]>>(MatDialogRef);
  protected readonly question = inject<SpreadQuestion>(MAT_DIALOG_DATA);

  protected readonly chosen = signal<ReadonlySet<SpreadTarget>>(new Set());
  protected readonly heading = computed(() => this.question.row.worked?.buildUp ?? this.question.row.zone.name);
  private readonly open = this.question.groups.flatMap(({ targets }) => targets.filter(({ isSame }) => !isSame));

  protected tick(target: SpreadTarget, isTicked: boolean): void {
    this.chosen.update((chosen) => {
      const next = new Set(chosen);
      if (isTicked) next.add(target);
      else next.delete(target);
      return next;
    });
  }

  protected all(): void {
    this.chosen.set(new Set(this.open));
  }

  protected lay(): void {
    this.reference.close([...this.chosen()]);
  }
}

/** The zones somebody chooses, or undefined where they would rather not. */
export async function askForZones(
  injector: Injector,
  question: SpreadQuestion,
): Promise<readonly SpreadTarget[] | undefined> {
  const asked = injector
    .get(MatDialog)
    .open<SpreadDialog, SpreadQuestion, readonly SpreadTarget[]>(SpreadDialog, { data: question, width: '560px' });
  return firstValueFrom(asked.afterClosed());
}
