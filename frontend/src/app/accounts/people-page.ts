import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { Invitation, WorkshopPerson } from '#shared/accounts/people-schema';
import type { Role } from '#shared/actor/role';
import { Formats } from '../core/formats/formats';
import { Notices } from '../core/problems/notices';
import { Session } from '../core/session/session';
import { EmptyState } from '../ui/page/empty-state';
import { PageHeader } from '../ui/page/page-header';
import { Skeleton } from '../ui/page/skeleton';
import { InviteForm } from './invite-form';
import { PeopleStore, isPerson } from './people-store';
import { roleNames } from './role-names';
import { RolesForm } from './roles-form';

/** Everybody of the workshop; an owner invites, gives roles and ends access here. */
@Component({
  selector: 'app-people-page',
  imports: [EmptyState, InviteForm, MatButton, PageHeader, RolesForm, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [PeopleStore],
  templateUrl: './people-page.html',
  styleUrl: './people-page.scss',
})
export class PeoplePage {
  protected readonly store = inject(PeopleStore);
  protected readonly formats = inject(Formats);
  private readonly session = inject(Session);
  private readonly notices = inject(Notices);

  protected readonly isOwner = computed(() => this.session.may('owner'));
  protected readonly isInviting = signal(false);
  protected readonly changing = signal<string | undefined>(undefined);
  protected readonly rows = computed(() =>
    this.store.people().map((colleague) => ({
      colleague,
      person: this.isOwner() && isPerson(colleague) ? colleague : undefined,
      email: isPerson(colleague) ? colleague.email : '',
      isSelf: colleague.accountId === this.session.facts()?.accountId,
    })),
  );

  protected rolesOf(held: readonly Role[]): string {
    return held.map((role) => roleNames[role].name).join(', ');
  }

  protected async turnAccess(person: WorkshopPerson): Promise<void> {
    await this.store.changeAccess(person, !person.isDisabled);
    const undo = { label: $localize`Undo`, run: () => void this.restore(person) };
    if (!person.isDisabled) this.notices.say($localize`${person.name}:name: can no longer come in.`, undo);
  }

  protected async withdraw(invitation: Invitation): Promise<void> {
    await this.store.withdraw(invitation);
    this.notices.say($localize`The invitation of ${invitation.name}:name: no longer works.`);
  }

  /** Access as it was before, from the version that ending it made. */
  private async restore(before: WorkshopPerson): Promise<void> {
    const now = this.store.people().find(({ membershipId }) => membershipId === before.membershipId);
    if (now && isPerson(now)) await this.store.changeAccess(now, before.isDisabled);
  }
}
