import { askForClientSignIn, beginClientVisit } from '#shared/client-page/visits-endpoints';
import { Rejection } from '#shared/problems/rejection';
import type { Accounts } from '../accounts';
import type { Agreements } from '../agreements';
import { mount, type Route } from '../platform/http/mount';
import type { ClientPageService } from './client-page-service';

type Ways = Pick<Agreements, 'visits' | 'signIns'>;

interface Parts {
  readonly ways: Ways;
  readonly throttle: Accounts['throttle'];
  readonly pages: Pick<ClientPageService, 'opening'>;
}

export const visitRoutes = ({ ways: { visits, signIns }, throttle, pages }: Parts): Route[] => [
  mount(beginClientVisit, async ({ body, session, from }) => {
    await throttle.beginLink(from.address);
    const visit = await visits.open(body.token);
    const client = visit && (await visits.load(visit));
    // The same answer for a link that has ended, was taken back, or never was.
    if (!client) throw new Rejection('gone', 'access-ended');
    await throttle.linkOpened(from.address);
    await session.beginVisit(visit);
    return { token: session.forgeryToken, ...(await pages.opening(client)) };
  }),
  mount(askForClientSignIn, async ({ body, from }) => {
    await throttle.beginLetter(body.email, from.address);
    await signIns.ask(body.email);
  }),
];
