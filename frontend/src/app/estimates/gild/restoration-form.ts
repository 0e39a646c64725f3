import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import type { StepKind } from '#shared/buildups/buildup';
import { settingsSchema } from '#shared/estimates/settings-schema';
import { Formats } from '../../core/formats/formats';
import type { Explained } from '../../ui/figure/explained';
import { Figure } from '../../ui/figure/figure';
import { EstimateStore } from '../estimate-store';
import { liveForm } from '../settings/live-form';

const restorationSchema = settingsSchema.pick({ restoration: true });

/** Steps that only old work asks for, by what their hours are called. */
const oldWork: readonly { readonly kind: StepKind; readonly name: string }[] = [
  { kind: 'clean', name: $localize`Cleaning` },
  { kind: 'consolidate', name: $localize`Consolidating` },
];

/** Whether old work is restored, and what that does: where lead has to be tested for, and the hours that old work takes. */
@Component({
  selector: 'app-restoration-form',
  imports: [Figure, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './restoration-form.html',
  styleUrl: './restoration-form.scss',
})
export class RestorationForm {
  private readonly formats = inject(Formats);
  protected readonly store = inject(EstimateStore);

  protected readonly isRestoration = computed(() => this.store.settings()?.restoration ?? false);
  protected readonly live = liveForm(
    {
      key: () => 'restoration',
      schema: restorationSchema,
      present: () => {
        const settings = this.store.settings();
        return settings && { restoration: settings.restoration };
      },
      apply: (change) => this.store.changeSettings(change),
    },
    { restoration: false },
  );
  /** “1,204 cm² in plan, zones: 6 of 23”. */
  protected readonly toTest = computed(() => {
    const figures = this.store.figures();
    const suspect = new Set(figures?.findings.filter(({ code }) => code === 'caution-lead').map(({ about }) => about));
    const zones = figures?.zones.filter(({ zoneId }) => suspect.has(zoneId)) ?? [];
    if (zones.length === 0) return '';
    const area = this.formats.area(zones.reduce((sum, { plan_mm2 }) => sum + plan_mm2, 0));
    const [some, all] = [zones.length, figures?.zones.length ?? 0].map((count) => this.formats.number(count, 0));
    return $localize`${area}:area: in plan, zones: ${some}:some: of ${all}:all:`;
  });
  protected readonly hours = computed(() =>
    oldWork.map(({ kind, name }) => ({ name, explained: this.explained(kind) })),
  );
  /** The build-ups that clean and consolidate, where none of them is used yet. */
  protected readonly offered = computed(() => {
    const isUsed = this.hours().some(({ explained }) => explained.reasons.length > 0);
    const all = this.store.card()?.buildUps.buildUps ?? [];
    const cleaning = all.filter(({ steps }) => steps.some((step) => oldWork.some(({ kind }) => kind === step.kind)));
    return isUsed ? '' : cleaning.map(({ name }) => $localize`“${name}:buildup:”`).join(', ');
  });

  private explained(kind: StepKind): Explained {
    const steps = this.store.figures()?.zones.flatMap((zone) => zone.steps.filter((step) => step.kind === kind)) ?? [];
    const hours = steps.reduce((sum, step) => sum + step.hours.likely, 0);
    const heading = this.formats.figure('hours', hours);
    return { id: `restoration ${kind}`, heading, reasons: steps.flatMap(({ reasons }) => reasons) };
  }
}
