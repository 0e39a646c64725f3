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
import type { MemberContent } from '#shared/estimates/member';
import { type ShapeKind, shapeKinds } from '#shared/measure/shape';
import { decimalSign } from '#shared/units/decimal-sign';
import { Formats } from '../../core/formats/formats';
import { Words } from '../../core/formats/words';
import { shapeEntries, shapeNames } from '../../measure';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { pastedLines } from '../../ui/table/pasted-lines';
import { pastedMembers, type Pasting } from './pasted-members';

type Start = Pasting['start'];

/** Shapes that lengths alone describe. */
const offered = shapeKinds.filter((kind) => {
  const ways = shapeEntries[kind].map(({ way }) => way);
  return kind !== 'band' && kind !== 'turned' && kind !== 'cabriole' && ways.includes('length');
});

/** Members from the rows of a spreadsheet; nothing is taken over while a cell is wrong. */
@Component({
  selector: 'app-paste-dialog',
  imports: [Entry, Field, MatButton, MatDialogActions, MatDialogClose, MatDialogContent, MatDialogTitle],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './paste-dialog.html',
  styleUrl: './paste-dialog.scss',
})
export class PasteDialog {
  private readonly formats = inject(Formats);
  private readonly words = inject(Words);
  private readonly start = inject<Start>(MAT_DIALOG_DATA);
  private readonly reference = inject<MatDialogRef<PasteDialog, readonly MemberContent[]>>(MatDialogRef);

  protected readonly kinds = offered.map((value) => ({ value, label: shapeNames[value] }));
  protected readonly kind = signal<ShapeKind>('rectangle');
  protected readonly text = signal('');
  private readonly lengths = computed(() => shapeEntries[this.kind()].filter(({ way }) => way === 'length'));
  protected readonly headings = computed(() => [
    $localize`Name`,
    $localize`How many`,
    ...this.lengths().map(({ label }) => label),
  ]);
  protected readonly order = computed(() => this.headings().join(', '));
  protected readonly rows = computed(() => {
    const reading = { unit: this.formats.lengthUnit(), decimalSign: decimalSign(this.formats.locale()) };
    const lengths = this.lengths().map(({ path }) => path);
    const headings = this.headings();
    return pastedMembers(pastedLines(this.text()), {
      kind: this.kind(),
      lengths,
      headings,
      reading,
      start: this.start,
    });
  });
  protected readonly wrong = computed(() => this.rows().filter(({ content }) => content === undefined).length);

  protected choose(kind: string): void {
    this.kind.set(kind as ShapeKind);
  }

  protected say({ complaint }: ReturnType<typeof pastedMembers>[number]['cells'][number]): string {
    return complaint ? this.words.say(complaint.code, complaint.values) : '';
  }

  protected take(): void {
    const contents = this.rows().flatMap(({ content }) => (content ? [content] : []));
    if (this.wrong() === 0 && contents.length > 0) this.reference.close(contents);
  }
}

/** The members somebody pastes, or undefined where they would rather not. */
export function askForPastedMembers(injector: Injector, start: Start): Promise<readonly MemberContent[] | undefined> {
  const asked = injector
    .get(MatDialog)
    .open<PasteDialog, Start, readonly MemberContent[]>(PasteDialog, { data: start, width: '800px' });
  return firstValueFrom(asked.afterClosed());
}
