import { ChangeDetectionStrategy, Component, computed, effect, inject, untracked } from '@angular/core';
import { Formats } from '../../core/formats/formats';
import type { Explained } from '../../ui/figure/explained';
import { Explanation } from '../../ui/figure/explanation';
import { Figure } from '../../ui/figure/figure';
import { EstimateStore } from '../estimate-store';
import { MemberSelection } from '../members/member-selection';

/** What a member's surface comes to: of one, of all alike, true with its relief, and what stays bare. */
@Component({
  selector: 'app-surface-figures',
  imports: [Figure],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <dl>
      @for (fact of facts(); track fact.name) {
        <div>
          <dt>{{ fact.name }}</dt>
          <dd><app-figure [text]="fact.text" [explained]="fact.explained" /></dd>
        </div>
      }
    </dl>
  `,
  styles: `
    dl {
      display: grid;
      gap: 12px 32px;
      grid-template-columns: repeat(auto-fit, minmax(136px, 1fr));
      align-content: start;
      margin: 0;
    }

    dt {
      color: var(--muted);
      font-size: 0.9375rem;
    }

    dd {
      margin: 0;
      font-size: 1.125rem;
      font-weight: 500;
    }
  `,
})
export class SurfaceFigures {
  private readonly store = inject(EstimateStore);
  private readonly selection = inject(MemberSelection);
  private readonly formats = inject(Formats);
  private readonly explanation = inject(Explanation);

  private readonly figures = computed(() =>
    this.store.figures()?.members.find(({ memberId }) => memberId === this.selection.member()?.id),
  );
  private readonly developed = computed<Explained | undefined>(() => {
    const figures = this.figures();
    if (!figures) return undefined;
    const heading = this.formats.area(figures.developed_mm2);
    return { id: `surface ${figures.memberId}`, heading, reasons: figures.reasons };
  });

  protected readonly facts = computed(() => {
    const figures = this.figures();
    if (!figures) return [];
    const count = this.selection.member()?.count ?? 1;
    const off = this.off(figures.uncertainty_mm2 ?? 0, figures.developed_mm2);
    const area = (name: string, area_mm2: number) => ({
      name,
      text: this.formats.area(area_mm2),
      explained: undefined,
    });
    return [
      {
        name: $localize`Developed surface of one`,
        text: `${this.formats.area(figures.developed_mm2)}${off}`,
        explained: this.developed(),
      },
      ...(count > 1 ? [area($localize`All ${count}:count:, less openings`, figures.plan_mm2)] : []),
      area($localize`True, with its relief`, figures.true_mm2),
      ...(figures.bare_mm2 > 0 ? [area($localize`Left bare`, figures.bare_mm2)] : []),
    ];
  });

  /** How far off, as a share to two figures: the areas themselves may be written in different units. */
  private off(uncertainty_mm2: number, developed_mm2: number): string {
    if (!(uncertainty_mm2 > 0 && developed_mm2 > 0)) return '';
    return ` ± ${this.formats.figure('percent', Number(((100 * uncertainty_mm2) / developed_mm2).toPrecision(2)))}`;
  }

  constructor() {
    // Where there is room beside it, the surface of the member one comes to explains itself unasked.
    effect(() => {
      const [developed, hasRoom] = [this.developed(), matchMedia('(min-width: 1181px)').matches];
      untracked(() => {
        const shown = this.explanation.current();
        const isOfAnother = !shown || (shown.id.startsWith('surface ') && shown.id !== developed?.id);
        if (developed && hasRoom && isOfAnother) this.explanation.show(developed);
      });
    });
  }
}
