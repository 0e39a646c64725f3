import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { EstimateSettings } from '#shared/estimates/settings';

/** What the paper of an issue says beside its figures. */
@Component({
  selector: 'app-frozen-texts',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @for (text of texts(); track text.heading) {
      <section>
        <h4>{{ text.heading }}</h4>
        <p>{{ text.text }}</p>
      </section>
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 12px;
    }

    p {
      white-space: pre-line;
      overflow-wrap: anywhere;
    }
  `,
})
export class FrozenTexts {
  readonly settings = input.required<Pick<EstimateSettings, 'introduction' | 'included' | 'excluded' | 'terms'>>();

  protected readonly texts = computed(() => {
    const { introduction, included, excluded, terms } = this.settings();
    const all = [
      { heading: $localize`Introduction`, text: introduction },
      { heading: $localize`Included`, text: included },
      { heading: $localize`Not included`, text: excluded },
      { heading: $localize`Terms`, text: terms },
    ];
    return all.filter(({ text }) => text.trim() !== '');
  });
}
