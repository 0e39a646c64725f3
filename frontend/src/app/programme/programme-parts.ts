import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { RouterLink, RouterLinkActive } from '@angular/router';
import { Session } from '../core/session/session';

/** The parts of the Programme place. */
@Component({
  selector: 'app-programme-parts',
  imports: [RouterLink, RouterLinkActive],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <nav i18n-aria-label aria-label="Parts of the programme" class="no-print">
      @for (part of parts; track part.path) {
        <a
          [routerLink]="part.path"
          routerLinkActive="open"
          ariaCurrentWhenActive="page"
          [routerLinkActiveOptions]="{ exact: true }"
          >{{ part.name }}</a
        >
      }
    </nav>
  `,
  styles: `
    nav {
      display: flex;
      flex-wrap: wrap;
      gap: 0 24px;
      padding: 0 28px;
      border-bottom: 1px solid var(--line);
    }

    a {
      padding: 10px 0 8px;
      border-bottom: 3px solid transparent;
      color: var(--muted);
      font: 500 1.125rem/1.5rem var(--heading);
      text-decoration: none;
    }

    a:hover {
      color: var(--ink);
    }

    a.open {
      border-color: var(--gold);
      color: var(--ink);
    }

    @media (max-width: 640px) {
      nav {
        padding: 0 16px;
      }
    }
  `,
})
export class ProgrammeParts {
  private readonly session = inject(Session);

  protected readonly parts = [
    { path: '/programme', name: $localize`Board`, isShown: true },
    { path: '/programme/workshop', name: $localize`Workshop`, isShown: this.session.may('owner', 'estimator') },
    { path: '/programme/calendars', name: $localize`Calendars`, isShown: true },
  ].filter(({ isShown }) => isShown);
}
