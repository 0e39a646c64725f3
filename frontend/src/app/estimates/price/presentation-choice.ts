import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';

/** Whether lines are shown, and written on the client’s paper, by member or by kind of work. */
@Component({
  selector: 'app-presentation-choice',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <fieldset [disabled]="isFixed()">
      <legend class="visually-hidden" i18n>Lines stand</legend>
      <label>
        <input
          type="radio"
          name="presentation"
          [checked]="presentation() === 'members'"
          (change)="changed.emit('members')"
        />
        <span i18n>By member</span>
      </label>
      <label>
        <input
          type="radio"
          name="presentation"
          [checked]="presentation() === 'kinds'"
          (change)="changed.emit('kinds')"
        />
        <span i18n>By kind of work</span>
      </label>
    </fieldset>
  `,
  styles: `
    fieldset {
      display: flex;
      border: 1px solid var(--edge);
      border-radius: var(--radius);
      overflow: hidden;
    }

    label {
      position: relative;
      display: flex;
      align-items: center;
      min-height: 42px;
      padding: 0 14px;
      cursor: pointer;
    }

    label + label {
      border-left: 1px solid var(--line);
    }

    label:has(input:checked) {
      background: var(--tint);
      font-weight: 500;
    }

    label:has(input:focus-visible) {
      outline: 2px solid var(--bole);
      outline-offset: -3px;
      border-radius: var(--radius);
    }

    input {
      position: absolute;
      opacity: 0;
    }
  `,
})
export class PresentationChoice {
  readonly presentation = input.required<'members' | 'kinds'>();
  /** The office reads; it changes nothing. */
  readonly isFixed = input(false);
  readonly changed = output<'members' | 'kinds'>();
}
