import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { OrnamentExtent } from '#shared/carving/ornament-use';
import type { RunFit } from '#shared/carving/run-fit';
import { Formats } from '../core/formats/formats';
import { ScaleDrawing } from '../ui/drawing/scale-drawing';
import type { ScaleView } from '../ui/drawing/scale-view';
import { runItems } from './run-items';
import { runPath } from './run-path';
import { RunWords } from './run-words';

const mostShown = 26;

/** One run to scale: its mitre leaves, its centrepiece and the repeats as they are fitted. A long run shows its beginning. */
@Component({
  selector: 'app-run-drawing',
  imports: [ScaleDrawing],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-scale-drawing [view]="view()" [label]="label()" [most_px]="150" />
    <p class="muted small">{{ words() }}</p>
  `,
  styles: `
    :host {
      display: grid;
      gap: 4px;
    }
  `,
})
export class RunDrawing {
  private readonly formats = inject(Formats);
  private readonly runWords = inject(RunWords);

  readonly ornamentId = input.required<string>();
  readonly ornament = input.required<string>();
  readonly run = input.required<Extract<OrnamentExtent, { way: 'run' }>>();
  readonly fit = input.required<RunFit>();

  protected readonly words = computed(() => this.runWords.ofFit(this.fit(), this.run()));
  protected readonly label = computed(
    () => $localize`${this.ornament()}:ornament: along the run: ${this.words()}:repeats:`,
  );
  private readonly items = computed(() => runItems(this.run(), this.fit()));

  protected readonly view = computed<ScaleView>(() => {
    const [height_mm, length_mm] = [this.fit().pitch_mm, this.run().run_mm];
    const last = this.items().at(mostShown - 1);
    const shown_mm = this.items().length > mostShown && last ? last.at_mm + last.size_mm : length_mm;
    const path = { ornamentId: this.ornamentId(), items: this.items(), top_mm: 0, height_mm, to_mm: shown_mm };
    const ends = { from: { x_mm: 0, y_mm: 0 }, to: { x_mm: shown_mm, y_mm: 0 } };
    return {
      paths: [
        { kind: 'axis', data: `M0 0H${shown_mm}M0 ${height_mm}H${shown_mm}` },
        { kind: 'outline', data: runPath(path) },
      ],
      dimensions: [{ ...ends, label_mm: shown_mm, side: 'above', ...this.wordsOfPart(shown_mm, length_mm) }],
      box: { left_mm: 0, top_mm: 0, width_mm: shown_mm, height_mm },
    };
  });

  private wordsOfPart(shown_mm: number, length_mm: number): { words?: string } {
    if (shown_mm >= length_mm) return {};
    const [shown, whole] = [shown_mm, length_mm].map((each_mm) => this.formats.roughLength(each_mm));
    return { words: $localize`${shown}:shown: shown of ${whole}:length:` };
  }
}
