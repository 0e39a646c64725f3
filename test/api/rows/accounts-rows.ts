import { randomUUID } from 'node:crypto';
import sharp from 'sharp';
import { askForReset } from '#shared/accounts/password-endpoints';
import { invite } from '#shared/accounts/people-endpoints';
import { askToFound, putLogo } from '#shared/accounts/workshop-endpoints';
import { password, type Api, type TestWorkshop } from '../start-api';
import { foundingSettings } from '../test-workshop';
import type { MatrixRows } from '../matrix-row';

const nothing = { prepare: () => ({}) };
const newPassword = 'nine slow otters swim';

const settings = (mark: string) => ({
  name: `${mark} Carvers`,
  ...foundingSettings,
  addressLines: [`${mark} street`],
  telephone: '',
  email: '',
  taxRegistration: '',
  defaultTaxCategory: 'S',
});

const versionOf = async (workshop: TestWorkshop, api: Api): Promise<number> =>
  (await api.app.accounts.workshops.get(workshop.id)).version;
const picture = () =>
  sharp({ create: { width: 40, height: 20, channels: 3, background: '#8a2e22' } })
    .png()
    .toBuffer();

async function invitation(workshop: TestWorkshop) {
  const email = `${randomUUID()}@${workshop.mark.toLowerCase()}.example`;
  const body = { name: `${workshop.mark} Guest`, email, roles: ['bench'] };
  const response = await workshop.people.owner.visitor.call(invite, { body, key: randomUUID() });
  return { id: (response.body as { id: string }).id, email };
}

async function tokenFor(api: Api, email: string): Promise<string> {
  const mails = await api.mails();
  const mail = mails.find(({ headers }) => headers.includes(email));
  return /#(\S+)/.exec(mail?.text ?? '')?.[1] ?? '';
}

async function colleague(workshop: TestWorkshop, api: Api) {
  const { actor } = await api.newcomer(workshop, 'bench');
  return { params: { id: actor.membershipId }, version: 1 };
}

async function foundation(workshop: TestWorkshop, api: Api) {
  const email = `${randomUUID()}@${workshop.mark.toLowerCase()}.example`;
  const visitor = await api.stranger();
  await visitor.call(askToFound, {
    body: { name: 'A Founder', email, workshop: { name: `${workshop.mark} Second`, ...foundingSettings } },
  });
  return tokenFor(api, email);
}

const withLogo = async (workshop: TestWorkshop, api: Api) => ({
  version: await versionOf(workshop, api),
  file: { name: 'mark.png', bytes: await picture() },
});

export const accountsRows: MatrixRows = {
  listHistory: { prepare: () => ({ query: { limit: 100 } }) },
  readSession: nothing,
  signIn: { prepare: ({ people }) => ({ body: { email: people.owner.email, password } }) },
  signOut: { ...nothing, bySomebodyNew: true },
  enterWorkshop: {
    prepare: (workshop, _api, caller) => ({
      body: {
        membershipId:
          workshop.id === caller.actor.workshopId
            ? caller.actor.membershipId
            : workshop.people.owner.actor.membershipId,
      },
    }),
    bySomebodyNew: true,
    namesRows: true,
  },
  listOwnSessions: nothing,
  endOwnSession: {
    prepare: async (workshop, api, caller) => {
      const { actor } = workshop.id === caller.actor.workshopId ? caller : workshop.people.owner;
      const [row] = await api.platform.database.select<{ id: string }>(
        'SELECT id FROM sessions WHERE account_id = :id LIMIT 1',
        {
          id: actor.accountId,
        },
      );
      return { params: { id: row?.id ?? '' } };
    },
    bySomebodyNew: true,
  },
  endOtherSessions: { ...nothing, bySomebodyNew: true },
  changePassword: { prepare: () => ({ body: { current: password, password: newPassword } }), bySomebodyNew: true },
  askForReset: { prepare: () => ({ body: { email: 'nobody@elsewhere.example' } }) },
  resetPassword: {
    prepare: async (workshop, api) => {
      const { email } = await api.newcomer(workshop, 'bench');
      await (await api.stranger()).call(askForReset, { body: { email } });
      return { body: { token: await tokenFor(api, email), password: newPassword } };
    },
  },
  askToFound: {
    prepare: () => ({
      body: {
        name: 'A Founder',
        email: 'founder@elsewhere.example',
        workshop: { name: 'Third Carvers', ...foundingSettings },
      },
    }),
  },
  foundByLink: {
    prepare: async (workshop, api) => ({ body: { token: await foundation(workshop, api), password: newPassword } }),
  },
  foundAnother: {
    prepare: ({ mark }) => ({ body: { name: `${mark} Annexe`, ...foundingSettings } }),
    bySomebodyNew: true,
  },
  readWorkshop: nothing,
  changeWorkshop: {
    prepare: async (workshop, api) => ({ version: await versionOf(workshop, api), body: settings(workshop.mark) }),
    history: 'history-workshop-changed',
  },
  readLogo: {
    prepare: async (workshop, api) => {
      await workshop.people.owner.visitor.call(putLogo, await withLogo(workshop, api));
      return {};
    },
  },
  putLogo: { prepare: withLogo, history: 'history-logo-changed' },
  removeLogo: {
    prepare: async (workshop, api) => ({ version: await versionOf(workshop, api) }),
    history: 'history-logo-removed',
  },
  listPeople: nothing,
  changeRoles: {
    prepare: async (workshop, api) => ({ ...(await colleague(workshop, api)), body: { roles: ['bench', 'office'] } }),
    history: 'history-roles-changed',
  },
  changeAccess: {
    prepare: async (workshop, api) => ({ ...(await colleague(workshop, api)), body: { isDisabled: true } }),
    history: 'history-access-ended',
  },
  changeOwnName: { prepare: ({ mark }) => ({ body: { name: `${mark} renamed` } }), bySomebodyNew: true },
  listInvitations: {
    prepare: async (workshop) => {
      await invitation(workshop);
      return {};
    },
  },
  invite: {
    prepare: ({ mark }) => ({
      body: { name: `${mark} Guest`, email: `${randomUUID()}@${mark.toLowerCase()}.example`, roles: ['estimator'] },
      key: randomUUID(),
    }),
    history: 'history-person-invited',
  },
  withdrawInvitation: {
    prepare: async (workshop) => ({ params: { id: (await invitation(workshop)).id } }),
    history: 'history-invitation-withdrawn',
  },
  readInvitation: {
    prepare: async (workshop, api) => ({
      body: { token: await tokenFor(api, (await invitation(workshop)).email) },
    }),
  },
  acceptInvitation: {
    prepare: async (workshop, api) => {
      const token = await tokenFor(api, (await invitation(workshop)).email);
      return { body: { token, name: `${workshop.mark} Guest`, password: newPassword } };
    },
  },
};
