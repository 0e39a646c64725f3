import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import * as z from 'zod';
import { percentEntry } from '#shared/problems/card-entry-schema';
import { complain } from '#shared/problems/complaints-of';
import { PercentField } from '../../ui/field/percent-field';
import { EstimateStore } from '../estimate-store';
import { liveForm } from '../settings/live-form';

/** Deposit and retention; together they can be no more than the contract. */
const stageTermsSchema = z
  .strictObject({ deposit_percent: percentEntry, retention_percent: percentEntry })
  .refine(({ deposit_percent, retention_percent }) => deposit_percent + retention_percent <= 100, {
    ...complain('stages-withhold-too-much'),
    path: ['retention_percent'],
  });

/** What is paid before the work begins, and what is held back until it has stood for a while. */
@Component({
  selector: 'app-stage-terms-form',
  imports: [PercentField, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form class="fields" [formGroup]="live.group">
      <app-percent-field
        i18n-label
        label="Deposit"
        i18n-hint
        hint="Recovered from the stages pro rata."
        formControlName="deposit_percent"
        [complaint]="live.message('deposit_percent', 'stages.deposit_percent')"
      />
      <app-percent-field
        i18n-label
        label="Retention"
        i18n-hint
        hint="Held back from every stage, given back in two halves."
        formControlName="retention_percent"
        [complaint]="live.message('retention_percent', 'stages.retention_percent')"
      />
    </form>
  `,
})
export class StageTermsForm {
  private readonly store = inject(EstimateStore);

  protected readonly live = liveForm(
    {
      key: () => 'stage terms',
      schema: stageTermsSchema,
      present: () => {
        const stages = this.store.settings()?.stages;
        return stages && { deposit_percent: stages.deposit_percent, retention_percent: stages.retention_percent };
      },
      apply: (terms) => {
        const stages = this.store.settings()?.stages;
        if (stages) this.store.changeSettings({ stages: { ...stages, ...terms } });
      },
    },
    { deposit_percent: 0, retention_percent: 0 },
  );
}
