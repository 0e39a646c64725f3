import type { Provider } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import type { Role } from '#shared/actor/role';
import { en } from '#shared/words/en';
import { CATALOGUE } from '../app/core/formats/catalogue';
import { Session } from '../app/core/session/session';
import type { SessionFacts, WorkshopFacts } from '../app/core/session/session-facts';

const workshop: WorkshopFacts = {
  id: '018f0000-0000-7000-8000-000000000001',
  name: 'Mill Yard Carvers',
  locale: 'en-GB',
  currency: 'EUR',
  lengthUnit: 'mm',
  timeZone: 'Europe/Dublin',
  defaultTaxCategory: 'S',
};

/** What every test of a page or widget provides: the English words. */
export const words: Provider = { provide: CATALOGUE, useValue: en };

/** Somebody of a workshop, with the roles and settings a test is about. */
export function factsOf(roles: readonly Role[], settings: Partial<WorkshopFacts> = {}): SessionFacts {
  const membership = { id: '018f0000-0000-7000-8000-000000000002', workshopName: workshop.name, roles };
  return {
    accountId: '018f0000-0000-7000-8000-000000000003',
    name: 'Imke Vale',
    email: 'imke@vale.example',
    memberships: [membership],
    membership,
    workshop: { ...workshop, ...settings },
  };
}

/** Signs somebody in for a test. */
export function signIn(roles: readonly Role[] = ['owner'], settings: Partial<WorkshopFacts> = {}): Session {
  const session = TestBed.inject(Session);
  session.put(factsOf(roles, settings), 'token-of-the-session');
  return session;
}
