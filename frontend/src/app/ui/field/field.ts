import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

let count = 0;

/** The frame of one entry: its label above, a hint or the complaint below, tied to the entry for screen readers. */
@Component({
  selector: 'app-field',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <label [for]="entryId" [class.visually-hidden]="labelHidden()">
      {{ label() }}
      @if (optional()) {
        <span class="muted" i18n>optional</span>
      }
    </label>
    <div class="line">
      <ng-content />
      <ng-content select="[fieldEnd]" />
    </div>
    @if (complaint()) {
      <p class="complaint" [id]="noteId" role="alert">{{ complaint() }}</p>
    } @else if (hint()) {
      <p class="muted" [id]="noteId">{{ hint() }}</p>
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 4px;
      min-width: 0;
      align-content: start;
    }

    label,
    p {
      font-size: 0.9375rem;
      line-height: 1.25rem;
    }

    label {
      font-weight: 500;
    }

    label .muted {
      font-weight: 400;
    }

    .line {
      display: flex;
      gap: 8px;
      align-items: center;
      min-width: 0;
    }

    .complaint {
      color: var(--wrong);
    }
  `,
})
export class Field {
  readonly label = input.required<string>();
  readonly hint = input('');
  readonly complaint = input('');
  readonly optional = input(false);
  /** For an entry in a table, whose column already names it on screen. */
  readonly labelHidden = input(false);

  readonly entryId = `entry-${++count}`;
  protected readonly noteId = `${this.entryId}-note`;
  readonly describedBy = computed(() => (this.complaint() || this.hint() ? this.noteId : null));
  readonly isWrong = computed(() => this.complaint() !== '');
}
