import {
  ChangeDetectionStrategy,
  Component,
  Injector,
  type OnInit,
  inject,
  input,
  output,
  runInInjectionContext,
  signal,
} from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { schemaForm, type SchemaForm } from '../../core/forms/schema-form';
import { Formats } from '../../core/formats/formats';
import { Notices } from '../../core/problems/notices';
import { focusFirst } from '../../ui/field/focus-first';
import { FormComplaint } from '../../ui/field/form-complaint';
import { NumberField } from '../../ui/field/number-field';
import { lotEntries, lotEntriesSchema, lotsWith } from './lot-entries';
import { ProgrammeStore } from './programme-store';
import type { WorkedLot } from './worked-lots';

/** How one lot is worked: in how many portions, by how many hands, on how many places; what is left empty stays as proposed. */
@Component({
  selector: 'app-lot-form',
  imports: [FormComplaint, MatButton, NumberField, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './lot-form.html',
  styles: `
    form {
      display: grid;
      gap: 12px 16px;
      grid-template-columns: repeat(auto-fill, minmax(min(100%, 200px), 1fr));
      align-items: start;
      padding: 8px 0 12px;
    }

    .whole {
      grid-column: 1 / -1;
    }
  `,
})
export class LotForm implements OnInit {
  private readonly injector = inject(Injector);
  private readonly notices = inject(Notices);
  private readonly formats = inject(Formats);
  protected readonly store = inject(ProgrammeStore);

  readonly lot = input.required<WorkedLot>();
  readonly closed = output();

  /** Why it was not kept. */
  protected readonly refused = signal('');
  protected form!: SchemaForm<ReturnType<typeof lotEntriesSchema>>;

  constructor() {
    focusFirst();
  }

  ngOnInit(): void {
    const lot = this.lot();
    runInInjectionContext(this.injector, () => {
      this.form = schemaForm(lotEntriesSchema(lot), lotEntries(lot));
    });
  }

  protected placesOn(rack: string): string {
    return $localize`Places it takes on ${rack}:rack:`;
  }

  /** What is done where nothing is entered. */
  protected proposed(entered: number | null, planned: number): string {
    return entered === null
      ? $localize`As proposed: ${this.formats.number(planned, 0)}:count:`
      : $localize`Empty: as proposed`;
  }

  protected async keep(): Promise<void> {
    const { lotId } = this.lot();
    this.refused.set('');
    await this.form.send(async (entries) => {
      const lots = lotsWith(this.store.answer()?.inputs.lots ?? [], lotId, entries);
      const isKept = await this.store.keepInputs({ lots });
      if (isKept) this.tell();
      else this.refused.set(this.store.refusal());
    });
  }

  private tell(): void {
    this.notices.say($localize`Kept. Plan it again to see what it does to the date.`);
    this.closed.emit();
  }
}
