import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import type { Climate } from '#shared/drying/climate';
import { Formats } from '../../core/formats/formats';
import type { Explained } from '../../ui/figure/explained';
import { Figure } from '../../ui/figure/figure';
import { EstimateStore } from '../estimate-store';

/** The moisture wood comes to rest at in the shop and where the piece will stand. */
@Component({
  selector: 'app-wood-moisture',
  imports: [Figure],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @for (rest of rests(); track rest.name) {
      <p>
        <span class="muted">{{ rest.name }}</span>&ngsp;
        <app-figure [text]="rest.explained.heading" [explained]="rest.explained" />
      </p>
    }
  `,
  styles: `
    :host {
      display: flex;
      flex-wrap: wrap;
      gap: 4px 24px;
    }
  `,
})
export class WoodMoisture {
  private readonly formats = inject(Formats);
  private readonly store = inject(EstimateStore);

  protected readonly rests = computed(() => {
    const [settings, dry] = [this.store.settings(), this.store.figures()?.dry];
    if (!settings || !dry) return [];
    return [
      { name: $localize`In the shop`, explained: this.explained('shop', settings.shop, dry.shopMoisture_percent) },
      {
        name: $localize`Where it will stand`,
        explained: this.explained('site', settings.site, dry.siteMoisture_percent),
      },
    ];
  });

  private explained(id: string, air: Climate, moisture_percent: number): Explained {
    const heading = this.formats.figure('percent', Number(moisture_percent.toFixed(1)));
    const values = { ...air, moisture_percent };
    const reason = { code: 'drying-moisture', values, figure: moisture_percent, unit: 'percent' } as const;
    return { id: `moisture ${id}`, heading, reasons: [reason] };
  }
}
