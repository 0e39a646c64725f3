import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { iconPaths, type IconName } from './icon-paths';

/** A line drawing beside words; it never stands for them, so it is hidden from screen readers. */
@Component({
  selector: 'app-icon',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<svg viewBox="0 0 24 24" aria-hidden="true" focusable="false"><path [attr.d]="path()" /></svg>`,
  styles: `
    :host {
      display: inline-flex;
      flex: none;
      width: 24px;
      height: 24px;
      vertical-align: middle;
    }

    svg {
      width: 100%;
      height: 100%;
      fill: none;
      stroke: currentColor;
      stroke-width: 1.5;
      stroke-linecap: round;
      stroke-linejoin: round;
    }
  `,
})
export class Icon {
  readonly name = input.required<IconName>();

  protected readonly path = computed(() => iconPaths[this.name()]);
}
