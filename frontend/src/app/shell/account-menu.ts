import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatMenuModule } from '@angular/material/menu';
import { RouterLink } from '@angular/router';
import { Session } from '../core/session/session';
import type { MembershipFacts } from '../core/session/session-facts';
import { SESSION_PORT } from '../core/session/session-port';
import { Theme, type ThemeChoice } from '../core/theme/theme';
import { Icon } from '../ui/icon/icon';

/** The person's own corner: their workshops, their profile, the people, the settings, light or dark, and the way out. */
@Component({
  selector: 'app-account-menu',
  imports: [Icon, MatMenuModule, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './account-menu.html',
  styleUrl: './account-menu.scss',
})
export class AccountMenu {
  private readonly session = inject(Session);
  private readonly port = inject(SESSION_PORT);
  private readonly theme = inject(Theme);

  protected readonly who = this.session.facts;
  protected readonly initials = computed(() => initialsOf(this.who()?.name ?? ''));
  protected readonly others = computed(() =>
    (this.who()?.memberships ?? []).filter(({ id }) => id !== this.who()?.membership?.id),
  );
  protected readonly isOwner = computed(() => this.session.may('owner'));
  protected readonly writesLetters = computed(() => this.session.may('owner', 'office'));
  protected readonly choice = this.theme.choice;
  protected readonly choices: readonly { readonly choice: ThemeChoice; readonly label: string }[] = [
    { choice: 'system', label: $localize`As the device has it` },
    { choice: 'light', label: $localize`Light` },
    { choice: 'dark', label: $localize`Dark` },
  ];

  protected choose(choice: ThemeChoice): void {
    this.theme.choose(choice);
  }

  protected enter(membership: MembershipFacts): Promise<void> {
    return this.port.enter(membership.id);
  }

  protected signOut(): Promise<void> {
    return this.port.signOut();
  }
}

/** The first letters of the first and the last name. */
function initialsOf(name: string): string {
  const parts = name.split(/\s+/).filter(Boolean);
  return [parts.at(0), parts.length > 1 ? parts.at(-1) : '']
    .map((part) => [...(part ?? '')][0] ?? '')
    .join('')
    .toUpperCase();
}
