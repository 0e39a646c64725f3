import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import type { BuildUpStep } from '#shared/buildups/buildup';

/** Steps a build-up offers and does not insist on, and which of them are done. */
@Component({
  selector: 'app-step-choice',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (offered().length > 0) {
      <fieldset>
        <legend i18n>Done besides</legend>
        <div class="ticks">
          @for (step of offered(); track step.id) {
            <label class="choice">
              <input type="checkbox" [checked]="step.isTicked" (change)="turn(step.id, !step.isTicked)" />
              <span>{{ step.name }}</span>
            </label>
          }
        </div>
      </fieldset>
    }
  `,
  styles: `
    .ticks {
      display: flex;
      flex-wrap: wrap;
      gap: 0 24px;
    }
  `,
})
export class StepChoice {
  readonly steps = input.required<readonly BuildUpStep[]>();
  readonly chosen = input.required<readonly string[]>();
  readonly changed = output<readonly string[]>();

  protected readonly offered = computed(() =>
    this.steps()
      .filter(({ optional }) => optional)
      .map(({ id, name }) => ({ id, name, isTicked: this.chosen().includes(id) })),
  );

  protected turn(id: string, isTicked: boolean): void {
    const others = this.chosen().filter((known) => known !== id);
    this.changed.emit(isTicked ? [...others, id] : others);
  }
}
