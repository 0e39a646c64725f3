import { ChangeDetectionStrategy, Component, input, signal } from '@angular/core';
import { type ControlValueAccessor, NG_VALUE_ACCESSOR } from '@angular/forms';
import { roles, type Role } from '#shared/actor/role';
import { roleNames } from './role-names';

/** The roles of one person, each with what it may do. */
@Component({
  selector: 'app-role-choice',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { class: 'whole' },
  template: `
    <fieldset [attr.aria-invalid]="complaint() ? true : null">
      <legend>{{ label() }}</legend>
      @for (role of roles; track role) {
        <label class="choice">
          <input
            type="checkbox"
            [checked]="held().includes(role)"
            [disabled]="isDisabled()"
            (change)="turn(role)"
            (blur)="visit()"
          />
          <span
            ><strong>{{ names[role].name }}</strong> <span class="muted">{{ names[role].may }}</span></span
          >
        </label>
      }
      @if (complaint()) {
        <p class="complaint" role="alert">{{ complaint() }}</p>
      }
    </fieldset>
  `,
  styles: `
    strong {
      font-weight: 500;
    }

    .muted {
      margin-left: 6px;
    }

    .complaint {
      color: var(--wrong);
    }
  `,
  providers: [{ provide: NG_VALUE_ACCESSOR, useExisting: RoleChoice, multi: true }],
})
export class RoleChoice implements ControlValueAccessor {
  readonly label = input.required<string>();
  readonly complaint = input('');

  protected readonly roles = roles;
  protected readonly names = roleNames;
  protected readonly held = signal<readonly Role[]>([]);
  protected readonly isDisabled = signal(false);
  private tell: (held: readonly Role[]) => void = () => undefined;
  protected visit: () => void = () => undefined;

  writeValue(held: readonly Role[] | null): void {
    this.held.set(held ?? []);
  }

  registerOnChange(tell: (held: readonly Role[]) => void): void {
    this.tell = tell;
  }

  registerOnTouched(visit: () => void): void {
    this.visit = visit;
  }

  setDisabledState(isDisabled: boolean): void {
    this.isDisabled.set(isDisabled);
  }

  /** Kept in the order of the list, whichever was ticked first. */
  protected turn(role: Role): void {
    this.held.update((held) => roles.filter((one) => (one === role ? !held.includes(role) : held.includes(one))));
    this.tell(this.held());
  }
}
