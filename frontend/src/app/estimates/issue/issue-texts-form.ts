import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { settingsSchema } from '#shared/estimates/settings-schema';
import { Formats } from '../../core/formats/formats';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { NumberField } from '../../ui/field/number-field';
import { EstimateStore } from '../estimate-store';
import { liveForm } from '../settings/live-form';
import { Validity } from './validity';

const issueTextsSchema = settingsSchema.pick({
  title: true,
  introduction: true,
  included: true,
  excluded: true,
  terms: true,
  validity_days: true,
  leafValidity_days: true,
});

const nothing = {
  ...{ title: '', introduction: '', included: '', excluded: '', terms: '' },
  ...{ validity_days: 60, leafValidity_days: 30 },
};

/** What the client's paper says beside its figures, and how long prices hold. */
@Component({
  selector: 'app-issue-texts-form',
  imports: [Entry, Field, NumberField, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './issue-texts-form.html',
})
export class IssueTextsForm {
  private readonly store = inject(EstimateStore);
  private readonly formats = inject(Formats);
  private readonly validity = inject(Validity);

  protected readonly live = liveForm(
    {
      key: () => 'issue texts',
      schema: issueTextsSchema,
      present: () => {
        const settings = this.store.settings();
        if (settings?.terms === undefined) return undefined;
        const { title, introduction = '', included = '', excluded = '', terms } = settings;
        const { validity_days = 60, leafValidity_days = 30 } = settings;
        return { title, introduction, included, excluded, terms, validity_days, leafValidity_days };
      },
      apply: (texts) => this.store.changeSettings(texts),
    },
    nothing,
  );
  protected readonly until = computed(
    () => $localize`Until ${this.formats.day(this.validity.until())}:day: if issued today.`,
  );
  protected readonly leafUntil = computed(
    () => $localize`Until ${this.formats.day(this.validity.leafUntil())}:day: if issued today.`,
  );
}
