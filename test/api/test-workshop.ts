import { randomUUID } from 'node:crypto';
import type { Actor } from '#shared/actor/actor';
import { roles, type Role } from '#shared/actor/role';
import type { App } from '../../backend/src/app';
import type { Platform } from '../../backend/src/platform/platform';
import { Visitor } from './visitor';

/** The password of everybody in the tests. */
export const password = 'seven grey herons wade';

export interface TestPerson {
  readonly actor: Actor;
  readonly email: string;
  readonly visitor: Visitor;
}

/** A workshop with one person of each role, all signed in. `mark` begins every text of it. */
export interface TestWorkshop {
  readonly id: string;
  readonly mark: string;
  readonly people: Readonly<Record<Role, TestPerson>>;
}

export const foundingSettings = {
  currency: 'EUR',
  locale: 'en-GB',
  lengthUnit: 'mm',
  timeZone: 'Europe/Vienna',
  paperSize: 'A4',
  country: 'AT',
} as const;

/** The server people are added to, and what their requests carry. */
export interface Door {
  readonly app: App;
  readonly platform: Platform;
  readonly headers: Readonly<Record<string, string>>;
}

interface Place {
  readonly id: string;
  readonly mark: string;
}

const nameOf = (mark: string): string => `${mark} Carvers`;

async function welcome(app: App, mark: string, name: string) {
  const email = `${name}@${mark.toLowerCase()}.example`;
  const account = await app.accounts.newcomers.welcome(
    { name: `${mark} ${name}`, email, password, address: 'test' },
    nameOf(mark),
  );
  return { accountId: account.id, name: account.name, email };
}

async function signedIn({ app, headers }: Door, person: { actor: Actor; email: string }): Promise<TestPerson> {
  const visitor = new Visitor(app.web.express, headers);
  const response = await visitor.signIn(person.email, password);
  if (response.status !== 200)
    throw new Error(`${person.email} could not sign in: ${response.status} ${response.text}`);
  return { ...person, visitor };
}

/** Adds somebody to a workshop and signs them in. */
export async function addPerson(door: Door, to: { workshop: Place; role: Role; name?: string }): Promise<TestPerson> {
  const { workshop, role, name = `${role}-${randomUUID().slice(0, 8)}` } = to;
  const { app, platform } = door;
  const actor = await platform.database.transaction(async () => {
    const { email, ...person } = await welcome(app, workshop.mark, name);
    const membershipId = await app.accounts.workshops.join(workshop.id, { ...person, roles: [role] });
    return { email, actor: { ...person, membershipId, workshopId: workshop.id, roles: [role] } };
  });
  return signedIn(door, actor);
}

async function found({ app, platform }: Door, mark: string) {
  return platform.database.transaction(async () => {
    const { email, ...owner } = await welcome(app, mark, 'owner');
    const id = await app.accounts.workshops.found(owner, { name: nameOf(mark), ...foundingSettings });
    const [membership] = await app.accounts.people.list(id);
    const actor: Actor = { ...owner, workshopId: id, membershipId: membership?.id ?? '', roles: ['owner'] };
    return { id, mark, owner: { email, actor } };
  });
}

export async function openWorkshop(door: Door, mark: string): Promise<TestWorkshop> {
  const { owner, ...workshop } = await found(door, mark);
  const people: Partial<Record<Role, TestPerson>> = { owner: await signedIn(door, owner) };
  for (const role of roles.filter((one) => one !== 'owner')) {
    people[role] = await addPerson(door, { workshop, role, name: role });
  }
  return { ...workshop, people: people as Record<Role, TestPerson> };
}
