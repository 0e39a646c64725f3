import { Injectable, inject } from '@angular/core';
import type { OrnamentExtent } from '#shared/carving/ornament-use';
import type { RunFit } from '#shared/carving/run-fit';
import { Formats } from '../core/formats/formats';

/** Words how much of an ornament there is, and how its repeats fall. */
@Injectable({ providedIn: 'root' })
export class RunWords {
  private readonly formats = inject(Formats);

  /** “16 repeats of 30.4 mm, stretched 1.3 %”. */
  ofFit({ repeats, halves, pitch_mm, stretch }: RunFit, run?: { readonly centre_mm: number | null }): string {
    if (repeats === 0) return $localize`no room for a repeat`;
    const count = this.formats.number(repeats, 0);
    const pitch = this.formats.length(pitch_mm);
    const fall = halves === 2 && run?.centre_mm ? $localize`, half on either side of the centrepiece` : '';
    return $localize`${count}:count: repeats of ${pitch}:pitch:${fall}:halves:, ${this.ofStretch(stretch)}:stretch:`;
  }

  /** “stretched 1.3 %”, “pressed 0.4 %” or “as drawn”. */
  ofStretch(stretch: number): string {
    const percent = Math.abs(stretch) * 100;
    if (percent < 0.05) return $localize`as drawn`;
    const written = this.formats.figure('percent', Number(percent.toFixed(1)));
    return stretch > 0 ? $localize`stretched ${written}:percent:` : $localize`pressed ${written}:percent:`;
  }

  /** The amount as it stands in a table: “12”, “2,860 mm”, “340 cm²”. */
  ofExtent(extent: OrnamentExtent): string {
    switch (extent.way) {
      case 'pieces':
        return this.formats.number(extent.count, 0);
      case 'run':
        return this.formats.length(extent.run_mm);
      case 'area':
        return this.formats.area(extent.area_mm2);
    }
  }

  /** What a run has besides its length: “× 3, 2 mitre leaves, centrepiece”. */
  ofRest(extent: OrnamentExtent): string {
    if (extent.way !== 'run') return '';
    const { runs, mitreLeaves, mitreLeaf_mm, centre_mm } = extent;
    return [
      runs === 1 ? '' : $localize`${this.formats.number(runs, 0)}:runs: runs`,
      mitreLeaves > 0 && mitreLeaf_mm > 0 ? $localize`${this.formats.number(mitreLeaves, 0)}:leaves: mitre leaves` : '',
      centre_mm === null ? '' : $localize`centrepiece`,
    ]
      .filter(Boolean)
      .join(', ');
  }
}
