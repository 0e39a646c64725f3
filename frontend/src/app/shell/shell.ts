import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { Router, RouterLink, RouterLinkActive, RouterOutlet } from '@angular/router';
import { Session } from '../core/session/session';
import { Icon } from '../ui/icon/icon';
import { Mark } from '../ui/icon/mark';
import { AccountMenu } from './account-menu';
import { servedPlaces } from './place';

/** What stands round every page of the workshop: the rail of places, a bar at the bottom on a phone, and the account menu. */
@Component({
  selector: 'app-shell',
  imports: [AccountMenu, Icon, Mark, RouterLink, RouterLinkActive, RouterOutlet],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './shell.html',
  styleUrl: './shell.scss',
})
export class Shell {
  private readonly session = inject(Session);
  private readonly router = inject(Router);

  protected readonly places = computed(() =>
    servedPlaces(this.router.config).filter(({ roles }) => this.session.may(...roles)),
  );
}
