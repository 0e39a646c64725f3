import { ChangeDetectionStrategy, Component, effect, inject } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { schemaForm } from '../../core/forms/schema-form';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { FormComplaint } from '../../ui/field/form-complaint';
import { NumberField } from '../../ui/field/number-field';
import { TemperatureField } from '../../ui/field/temperature-field';
import { ProgrammeStore } from './programme-store';
import { startEntries, startFormSchema, startInputsOf } from './start-form';

/** From when or by when it is planned, the days kept in hand, and the air. */
@Component({
  selector: 'app-programme-start',
  imports: [Entry, Field, FormComplaint, MatButton, NumberField, ReactiveFormsModule, TemperatureField],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form [formGroup]="form.group" (ngSubmit)="keep()">
      <app-field i18n-label label="Plan it">
        <select appEntry formControlName="direction">
          <option value="forward" i18n>to start on a day</option>
          <option value="backward" i18n>to be ready by a day</option>
        </select>
      </app-field>
      <app-field [label]="isBackward() ? readyBy : startOn" [complaint]="form.message('day')">
        <input appEntry type="date" formControlName="day" />
      </app-field>
      <app-number-field
        class="short"
        i18n-label
        label="Working days in hand"
        formControlName="inHand_days"
        [complaint]="form.message('inHand_days')"
      />
      <app-field i18n-label label="Air of the workshop">
        <select appEntry formControlName="hasOwnAir">
          <option [ngValue]="false" i18n>as it usually is</option>
          <option [ngValue]="true" i18n>given here</option>
        </select>
      </app-field>
      @if (entered()?.hasOwnAir) {
        <app-temperature-field
          class="short"
          i18n-label
          label="Temperature"
          formControlName="temperature_celsius"
          [complaint]="form.message('temperature_celsius')"
        />
        <app-number-field
          class="short"
          i18n-label
          label="Humidity"
          unit="%"
          formControlName="humidity_percent"
          [complaint]="form.message('humidity_percent')"
        />
      }
      @if (form.isDirty()) {
        <button matButton="outlined" type="submit" [disabled]="store.isKeeping()" i18n>Keep these</button>
      }
      <app-form-complaint [texts]="form.general()" />
    </form>
  `,
  styles: `
    form {
      display: flex;
      flex-wrap: wrap;
      gap: 12px 16px;
      align-items: end;
    }

    app-field {
      width: 180px;
    }

    .short {
      width: 150px;
    }

    app-form-complaint {
      flex-basis: 100%;
    }

    @media (max-width: 640px) {
      app-field {
        width: 100%;
      }

      .short {
        width: calc(50% - 8px);
      }
    }
  `,
})
export class ProgrammeStart {
  protected readonly store = inject(ProgrammeStore);
  protected readonly startOn = $localize`Start on`;
  protected readonly readyBy = $localize`Ready by`;
  protected readonly form = schemaForm(startFormSchema, {
    direction: 'forward',
    day: '',
    inHand_days: 0,
    hasOwnAir: false,
    temperature_celsius: null,
    humidity_percent: null,
  });
  protected readonly entered = toSignal(this.form.group.valueChanges, { initialValue: undefined });

  constructor() {
    effect(() => {
      const inputs = this.store.answer()?.inputs;
      if (inputs) this.form.reset(startEntries(inputs));
    });
  }

  protected isBackward(): boolean {
    return this.entered()?.direction === 'backward';
  }

  protected async keep(): Promise<void> {
    await this.form.send(async (entries) => this.store.keepInputs(startInputsOf(entries)));
  }
}
