import { ChangeDetectionStrategy, Component, input } from '@angular/core';

/** What is to be said of a form as a whole, above its button. */
@Component({
  selector: 'app-form-complaint',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { role: 'alert', class: 'whole' },
  template: `
    @for (text of texts(); track text) {
      <p>{{ text }}</p>
    }
  `,
  styles: `
    :host {
      display: block;
    }

    p {
      padding: 6px 12px;
      border-left: 3px solid var(--wrong);
      color: var(--wrong);
    }
  `,
})
export class FormComplaint {
  readonly texts = input.required<readonly string[]>();
}
