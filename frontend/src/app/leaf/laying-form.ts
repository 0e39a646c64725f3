import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { type LayingWay, layingWays } from '#shared/leaf/leaf-card';
import type { LaysOption } from '#shared/leaf/lays-laying';
import type { AnyDocumentForm } from '../core/forms/document-form';
import { Entry } from '../ui/field/entry';
import { EntryAt, type EntryChoice } from '../ui/field/entry-at';
import { Field } from '../ui/field/field';
import { laidAs, layingNames, type LaidAs } from './laying-names';
import { StripOptions } from './strip-options';

/** How leaf is to be laid on a zone; `proposed` follows shape, relief and width, null is worked out. */
interface LayingChoice {
  readonly way: 'proposed' | LayingWay;
  readonly strips: number | null;
  readonly cuts: number | null;
}

const cutChoices: readonly EntryChoice[] = [
  { value: null, label: $localize`as the card has it` },
  ...[1, 2, 3, 4].map((cuts) => ({ value: cuts, label: $localize`${cuts}:cuts: by ${cuts}:cutsAgain:` })),
];

/** Which way leaf is laid, with what every number of strips would take and cost. */
@Component({
  selector: 'app-laying-form',
  imports: [Entry, EntryAt, Field, StripOptions],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="line">
      <app-field i18n-label label="Laid as">
        <select #way appEntry (change)="turn(way.value)">
          <option value="proposed" [selected]="present()?.way === 'proposed'">{{ proposal() }}</option>
          @for (known of ways; track known) {
            <option [value]="known" [selected]="present()?.way === known">{{ names[known] }}</option>
          }
        </select>
      </app-field>
      @if (laid()?.way === 'patches') {
        <app-entry-at
          way="choice"
          i18n-label
          label="A leaf is cut"
          [choices]="cuts"
          [form]="form()"
          [path]="path() + '.cuts'"
        />
      }
    </div>
    @if (laid()?.way === 'lays' && options().length > 0) {
      <app-strip-options
        [options]="options()"
        [chosen]="present()?.strips ?? null"
        [taken]="laid()?.strips ?? null"
        [perZone]="perZone()"
        (picked)="strip($event)"
      />
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 8px;
    }

    .line {
      display: flex;
      flex-wrap: wrap;
      gap: 12px 16px;
    }

    .line > * {
      flex: 1 1 200px;
      max-width: 300px;
    }
  `,
})
export class LayingForm {
  readonly form = input.required<AnyDocumentForm>();
  /** Where the laying stands in the document. */
  readonly path = input.required<string>();
  /** How it is laid as things stand; null where no leaf is. */
  readonly laid = input<LaidAs | null>(null);
  /** Every way to cut the leaf in strips, on one member. */
  readonly options = input<readonly LaysOption[]>([]);
  /** What the zone takes for each leaf of one member: its relief, its share, how many members there are. */
  readonly perZone = input(1);

  protected readonly names = layingNames;
  protected readonly ways = layingWays;
  protected readonly cuts = cutChoices;
  protected readonly present = computed(() => this.form().value<LayingChoice>(this.path()));
  protected readonly proposal = computed(() => {
    const laid = this.laid();
    return laid && this.present()?.way === 'proposed'
      ? $localize`proposed: ${laidAs(laid)}:laid:`
      : $localize`as proposed`;
  });

  protected turn(way: string): void {
    this.form().put(this.path(), { way, strips: null, cuts: null });
  }

  protected strip(strips: number | null): void {
    this.form().put(`${this.path()}.strips`, strips);
  }
}
