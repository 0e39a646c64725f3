import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { FieldChange } from '#shared/audit/field-changes';
import { FieldWords } from './field-words';

/** Which fields changed, each from what it was to what it is. */
@Component({
  selector: 'app-change-list',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <ul class="plain">
      @for (change of worded(); track $index) {
        <li>
          <span class="label">{{ change.label }}</span>
          @if (change.deed) {
            <span>{{ change.deed }}</span>
          } @else {
            <span>
              <del><span class="visually-hidden" i18n>was</span> {{ change.before }}</del>
              <span aria-hidden="true"> → </span>
              <ins><span class="visually-hidden" i18n>is now</span> {{ change.after }}</ins>
            </span>
          }
        </li>
      }
    </ul>
  `,
  styles: `
    li {
      display: flex;
      flex-wrap: wrap;
      gap: 0 12px;
      font-size: 0.9375rem;
      line-height: 1.5rem;
      overflow-wrap: anywhere;
    }

    .label,
    del {
      color: var(--muted);
    }

    .label::after {
      content: ':';
    }

    del,
    ins {
      text-decoration: none;
      white-space: pre-line;
    }
  `,
})
export class ChangeList {
  private readonly words = inject(FieldWords);

  readonly changes = input.required<readonly FieldChange[]>();

  protected readonly worded = computed(() => this.changes().map((change) => this.words.of(change)));
}
