import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { dryingFactor } from '#shared/drying/drying-factor';
import type { ClimateModel } from '#shared/buildups/buildup';
import type { EstimateSettings } from '#shared/estimates/settings';
import { settingsSchema } from '#shared/estimates/settings-schema';
import { Formats } from '../../core/formats/formats';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { NumberField } from '../../ui/field/number-field';
import { TemperatureField } from '../../ui/field/temperature-field';
import type { Explained } from '../../ui/figure/explained';
import { Figure } from '../../ui/figure/figure';
import { FindingList } from '../../ui/page/finding-list';
import { gatheredFindings } from '../../drying';
import { EstimateStore } from '../estimate-store';
import { isOfAir } from './is-of-air';
import { liveForm } from '../settings/live-form';

const airSchema = settingsSchema.pick({ shop: true, site: true, place: true });

const placeNames: Readonly<Record<EstimateSettings['place'], string>> = {
  indoors: $localize`Indoors`,
  outdoors: $localize`Outdoors`,
  damp: $localize`In the damp`,
};

const dryingNames: Readonly<Record<ClimateModel, string>> = {
  water: $localize`what dries in water`,
  oil: $localize`oil`,
  spirit: $localize`spirit`,
};

const blank = { temperature_celsius: null, humidity_percent: null };

/** The air of the shop and of the place the piece is for, and how much longer or quicker things dry in the shop. */
@Component({
  selector: 'app-air-form',
  imports: [Entry, Field, Figure, FindingList, NumberField, ReactiveFormsModule, TemperatureField],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './air-form.html',
  styleUrl: './air-form.scss',
})
export class AirForm {
  private readonly formats = inject(Formats);
  protected readonly store = inject(EstimateStore);

  protected readonly places = Object.entries(placeNames).map(([value, label]) => ({ value, label }));
  protected readonly live = liveForm(
    {
      key: () => 'air',
      schema: airSchema,
      present: () => {
        const settings = this.store.settings();
        return settings && { shop: settings.shop, site: settings.site, place: settings.place };
      },
      apply: (air) => this.store.changeSettings(air),
    },
    { shop: blank, site: blank, place: 'indoors' },
  );
  /** For whoever may not change it. */
  protected readonly inWords = computed(() => {
    const settings = this.store.settings();
    if (!settings) return [];
    return [
      { name: $localize`Air of the shop`, text: this.air(settings.shop) },
      { name: $localize`Air where it will stand`, text: this.air(settings.site) },
      { name: $localize`It will stand`, text: placeNames[settings.place] },
    ];
  });
  private readonly factors = computed(() => {
    const [shop, card] = [this.store.settings()?.shop, this.store.card()?.drying];
    if (!shop || !card) return [];
    return (['water', 'oil'] as const).map((model) => ({ model, ...dryingFactor(model, shop, card) }));
  });
  protected readonly paces = computed(() =>
    this.factors().flatMap(({ model, factor, reasons, isClipped }) => {
      if (factor === null) return [];
      const heading =
        Math.abs(factor - 1) < 0.005
          ? $localize`as long as the card says`
          : $localize`${this.formats.number(factor, 2)}:factor: times as long as the card says`;
      const explained: Explained = { id: `pace ${model}`, heading, reasons };
      return [{ model, name: dryingNames[model], explained, isClipped }];
    }),
  );
  /** What the air of the shop does to everything that dries in it, said once. */
  protected readonly findings = computed(() =>
    gatheredFindings((this.store.figures()?.findings ?? []).filter(isOfAir)).map(({ finding }) => finding),
  );

  private air({ temperature_celsius, humidity_percent }: EstimateSettings['shop']): string {
    return [this.formats.figure('celsius', temperature_celsius), this.formats.figure('percent', humidity_percent)].join(
      ', ',
    );
  }
}
