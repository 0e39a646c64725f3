import {
  ChangeDetectionStrategy,
  Component,
  Injector,
  type OnInit,
  inject,
  input,
  runInInjectionContext,
  signal,
} from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { Formats } from '../../core/formats/formats';
import { schemaForm, type SchemaForm } from '../../core/forms/schema-form';
import { Notices } from '../../core/problems/notices';
import { FormComplaint } from '../../ui/field/form-complaint';
import { NumberField } from '../../ui/field/number-field';
import { handsEntriesSchema, handsWith } from './hands-entries';
import { ProgrammeStore } from './programme-store';
import type { TaskWork } from './task-work';

/** How many hands the work of a task takes at once: of its step on the lot, or of carving the member. */
@Component({
  selector: 'app-task-hands',
  imports: [FormComplaint, MatButton, NumberField, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form [formGroup]="form.group" (ngSubmit)="keep()">
      <app-number-field
        i18n-label
        label="Hands it takes at once"
        [hint]="hint()"
        formControlName="crew"
        [complaint]="form.message('crew')"
      />
      <button matButton="outlined" type="submit" [disabled]="store.isKeeping()" i18n>Keep it so</button>
      <app-form-complaint [texts]="refused() ? [refused()] : form.general()" />
    </form>
  `,
  styles: `
    form {
      display: flex;
      flex-wrap: wrap;
      gap: 4px 12px;
      align-items: flex-start;
      margin-top: 8px;
    }

    // In line with the entry, whose name stands above it.
    button {
      margin-top: 28px;
    }

    app-number-field {
      width: min(100%, 380px);
    }

    app-form-complaint {
      flex-basis: 100%;
    }
  `,
})
export class TaskHands implements OnInit {
  private readonly injector = inject(Injector);
  private readonly notices = inject(Notices);
  private readonly formats = inject(Formats);
  protected readonly store = inject(ProgrammeStore);

  readonly work = input.required<TaskWork>();

  /** Why it was not kept. */
  protected readonly refused = signal('');
  protected form!: SchemaForm<ReturnType<typeof handsEntriesSchema>>;

  ngOnInit(): void {
    const work = this.work();
    runInInjectionContext(this.injector, () => {
      this.form = schemaForm(handsEntriesSchema(work), { crew: work.entered });
    });
  }

  protected hint(): string {
    const { isCarving, crew, entered } = this.work();
    const hands = this.formats.number(crew, 0);
    const meant = isCarving
      ? $localize`For all carving of this member by this grade.`
      : $localize`For this step on the whole lot.`;
    const empty = isCarving ? $localize`Empty: one.` : $localize`Empty: as the lot is worked.`;
    return [meant, entered === null ? $localize`Now: ${hands}:hands:.` : empty].join(' ');
  }

  protected async keep(): Promise<void> {
    const { workId } = this.work();
    this.refused.set('');
    await this.form.send(async (entries) => {
      const hands = handsWith(this.store.answer()?.inputs.hands ?? [], workId, entries);
      if (await this.store.keepInputs({ hands }))
        this.notices.say($localize`Kept. Plan it again to see what it does to the date.`);
      else this.refused.set(this.store.refusal());
    });
  }
}
