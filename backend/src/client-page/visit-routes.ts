import { askForClientSignIn, beginClientVisit } from '#shared/client-page/visits-endpoints';
import { Rejection } from '#shared/problems/rejection';
import type { Accounts } from '../accounts';
import type { Agreements } from '../agreements';
import { mount, type Route } from '../platform/http/mount';

type Ways = Pick<Agreements, 'visits' | 'signIns'>;

export const visitRoutes = ({ visits, signIns }: Ways, throttle: Accounts['throttle']): Route[] => [
  mount(beginClientVisit, async ({ body, session, from }) => {
    await throttle.beginLink(from.address);
    const visit = await visits.open(body.token);
    // The same answer for a link that has ended, was taken back, or never was.
    if (!visit) throw new Rejection('gone', 'access-ended');
    await throttle.linkOpened(from.address);
    await session.beginVisit(visit);
    return { token: session.forgeryToken };
  }),
  mount(askForClientSignIn, ({ body }) => signIns.ask(body.email)),
];
