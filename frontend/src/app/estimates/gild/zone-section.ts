import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { ZoneFigures } from '#shared/estimates/figures';
import { stripLayers } from '../../buildups';
import { Formats } from '../../core/formats/formats';
import { SectionStrip } from '../../ui/drawing/section-strip';
import type { Explained } from '../../ui/figure/explained';
import { Figure } from '../../ui/figure/figure';

/** The build-up of a zone as the cross-section of its layers, with its ground and the hours it takes. */
@Component({
  selector: 'app-zone-section',
  imports: [Figure, SectionStrip],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h3>{{ zone().buildUp }}</h3>
    <app-section-strip [layers]="layers()" />
    <dl>
      <div>
        <dt i18n>Hands on</dt>
        <dd><app-figure [text]="hours().heading" [explained]="hours()" /></dd>
      </div>
      @if (recutting(); as recut) {
        <div>
          <dt i18n>Recutting in gesso</dt>
          <dd><app-figure [text]="recut.heading" [explained]="recut" /></dd>
        </div>
      }
      @if (zone().ground_mm > 0) {
        <div>
          <dt i18n>Ground</dt>
          <dd>{{ ground() }}</dd>
        </div>
      }
    </dl>
  `,
  styles: `
    :host {
      display: grid;
      gap: 12px;
    }

    dl {
      display: flex;
      flex-wrap: wrap;
      gap: 4px 24px;
      margin: 0;
    }

    div {
      display: flex;
      gap: 8px;
    }

    dt {
      color: var(--muted);
    }

    dd {
      margin: 0;
      font-weight: 500;
    }
  `,
})
export class ZoneSection {
  private readonly formats = inject(Formats);

  readonly zone = input.required<ZoneFigures>();
  readonly timber = input.required<string>();

  protected readonly layers = computed(() =>
    stripLayers(this.zone().layers, { timber: this.timber(), leaf: this.zone().leaf?.name ?? '' }),
  );
  protected readonly ground = computed(() => this.formats.length(this.zone().ground_mm));
  protected readonly hours = computed<Explained>(() => {
    const { zoneId, hours } = this.zone();
    const steps = this.zone().steps.filter(({ kind }) => kind !== 'recut');
    const heading = this.formats.figure('hours', hours.likely);
    return { id: `hours ${zoneId}`, heading, reasons: steps.flatMap(({ reasons }) => reasons) };
  });
  /** Counted with the carving, and so not among the hands-on hours above. */
  protected readonly recutting = computed<Explained | undefined>(() => {
    const { zoneId, recutting } = this.zone();
    if (!recutting) return undefined;
    const heading = this.formats.figure('hours', recutting.hours.likely);
    return { id: `recutting ${zoneId}`, heading, reasons: recutting.reasons };
  });
}
