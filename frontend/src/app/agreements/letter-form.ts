import { ChangeDetectionStrategy, Component, computed, effect, inject, input, output, resource } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { debounceTime } from 'rxjs';
import { letterTextSchema, type LetterTemplate } from '#shared/agreements/letter-template-schema';
import { keepLetterTemplate, previewLetter, resetLetterTemplate } from '#shared/agreements/letters-endpoints';
import { Api } from '../core/api/api';
import { holdWhileDirty } from '../core/forms/hold-while-dirty';
import { schemaForm } from '../core/forms/schema-form';
import { Notices } from '../core/problems/notices';
import { Confirm } from '../ui/dialog/confirm';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { FormComplaint } from '../ui/field/form-complaint';

/** So long after the last key the example is asked for. */
const pause_ms = 500;

/** The words of one kind of letter, with the letter as it would leave beside them. */
@Component({
  selector: 'app-letter-form',
  imports: [Entry, Field, FormComplaint, MatButton, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './letter-form.html',
  styleUrl: './letter-form.scss',
})
export class LetterForm {
  private readonly api = inject(Api);
  private readonly notices = inject(Notices);
  private readonly confirm = inject(Confirm);

  readonly template = input.required<LetterTemplate>();
  readonly kept = output<LetterTemplate>();

  protected readonly form = schemaForm(letterTextSchema, { subject: '', text: '' });
  /** What is shown as a letter: the words with the kind they were written for, since of another one they may name what it does not know. */
  private readonly written = computed(() => {
    const words = this.form.parsed();
    return words && { kind: this.template().kind, ...words };
  });
  private readonly rested = toSignal(toObservable(this.written).pipe(debounceTime(pause_ms)));
  private readonly previewing = resource({
    params: () => this.rested(),
    loader: ({ params: body, abortSignal }) => this.api.call(previewLetter, { body, signal: abortSignal }),
  });
  protected readonly preview = computed(() => (this.previewing.hasValue() ? this.previewing.value() : undefined));
  protected readonly problem = computed(() => this.previewing.error()?.message ?? '');
  protected readonly isOwn = computed(() => this.template().version > 0);

  constructor() {
    holdWhileDirty(this.form);
    effect(() => {
      const { subject, text } = this.template();
      this.form.reset({ subject, text });
    });
  }

  protected async keep(): Promise<void> {
    const { kind, version } = this.template();
    await this.form.send(async (body) => {
      this.kept.emit(await this.api.call(keepLetterTemplate, { body: { kind, ...body }, version }));
      this.notices.say($localize`The words are kept.`);
    });
  }

  protected async reset(): Promise<void> {
    const isSure = await this.confirm.ask({
      heading: $localize`Go back to the first words?`,
      text: $localize`What you wrote for this letter is gone for good.`,
      yes: $localize`Go back to them`,
    });
    if (!isSure) return;
    this.kept.emit(await this.api.call(resetLetterTemplate, { body: { kind: this.template().kind } }));
  }

  /** Puts a placeholder in at the end of the text. */
  protected add(placeholder: string): void {
    const { text } = this.form.group.controls;
    text.setValue(`${text.value}{${placeholder}}`);
    text.markAsDirty();
  }
}
