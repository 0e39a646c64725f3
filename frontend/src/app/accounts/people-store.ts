import { Injectable, computed, inject, resource } from '@angular/core';
import {
  changeAccess,
  changeRoles,
  invite,
  listInvitations,
  listPeople,
  withdrawInvitation,
} from '#shared/accounts/people-endpoints';
import type { Colleague, Invitation, NewInvitation, WorkshopPerson } from '#shared/accounts/people-schema';
import type { Role } from '#shared/actor/role';
import { Api } from '../core/api/api';
import { newId } from '../core/new-id';
import { Session } from '../core/session/session';

/** Whether a colleague is shown with what owners and estimators see: address and version. */
export const isPerson = (colleague: Colleague | WorkshopPerson): colleague is WorkshopPerson => 'version' in colleague;

/** The people of the workshop and the invitations under way. */
@Injectable()
export class PeopleStore {
  private readonly api = inject(Api);
  private readonly session = inject(Session);
  private readonly listed = resource({
    loader: ({ abortSignal }) => this.api.call(listPeople, { signal: abortSignal }),
  });
  private readonly invited = resource({
    params: () => this.session.may('owner') || undefined,
    loader: ({ abortSignal }) => this.api.call(listInvitations, { signal: abortSignal }),
  });
  private inviteKey = newId();

  readonly people = computed<readonly (Colleague | WorkshopPerson)[]>(() =>
    this.listed.hasValue() ? this.listed.value().items : [],
  );
  readonly invitations = computed<readonly Invitation[]>(() =>
    this.invited.hasValue() ? this.invited.value().items : [],
  );
  readonly isLoading = this.listed.isLoading;
  readonly problem = computed(() => this.listed.error()?.message ?? '');

  /** Invites somebody; the same key until it succeeded, so that a second press sends no second mail. */
  async invite(body: NewInvitation): Promise<void> {
    await this.api.call(invite, { body, idempotencyKey: this.inviteKey });
    this.inviteKey = newId();
    this.invited.reload();
  }

  async withdraw(invitation: Invitation): Promise<void> {
    await this.api.call(withdrawInvitation, { params: { id: invitation.id } });
    this.invited.reload();
  }

  async changeRoles(person: WorkshopPerson, held: readonly Role[]): Promise<void> {
    const changed = await this.api.call(changeRoles, {
      params: { id: person.membershipId },
      body: { roles: [...held] },
      version: person.version,
    });
    this.replace(changed);
  }

  async changeAccess(person: WorkshopPerson, isDisabled: boolean): Promise<void> {
    this.replace(
      await this.api.call(changeAccess, {
        params: { id: person.membershipId },
        body: { isDisabled },
        version: person.version,
      }),
    );
  }

  reload(): void {
    this.listed.reload();
  }

  private replace(person: WorkshopPerson): void {
    this.listed.set({ items: this.people().map((one) => (one.membershipId === person.membershipId ? person : one)) });
  }
}
