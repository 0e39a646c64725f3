import {
  askToFound,
  changeWorkshop,
  foundAnother,
  foundByLink,
  putLogo,
  readLogo,
  readWorkshop,
  removeLogo,
} from '#shared/accounts/workshop-endpoints';
import { FileAnswer } from '../platform/http/answer';
import { mount, type Route } from '../platform/http/mount';
import type { Identity, SessionControl } from '../platform/session/session-control';
import type { FoundationService } from './foundation-service';
import type { IdentityService } from './identity-service';
import { presentSession } from './session-presenter';
import { presentWorkshop } from './workshop-presenter';
import type { WorkshopService } from './workshop-service';

interface Parts {
  readonly foundations: FoundationService;
  readonly workshops: WorkshopService;
  readonly identities: IdentityService;
}

export function workshopRoutes({ foundations, workshops, identities }: Parts): Route[] {
  const present = async (session: SessionControl, identity: Identity) =>
    presentSession(session.forgeryToken, await identities.facts(identity));
  return [
    mount(askToFound, ({ body }) => foundations.ask(body)),
    mount(foundByLink, async ({ body, session, from }) => {
      const identity = await foundations.byLink(body.token, { password: body.password, address: from.address });
      await session.signIn(identity);
      return present(session, identity);
    }),
    mount(foundAnother, async ({ person, body, session }) => {
      const identity = await foundations.another(person, body);
      await session.enter(identity);
      return present(session, identity);
    }),
    mount(readWorkshop, async ({ actor }) => presentWorkshop(await workshops.get(actor.workshopId))),
    mount(
      changeWorkshop,
      async ({ actor, version, body }) => presentWorkshop(await workshops.change(actor, version, body)),
      presentWorkshop,
    ),
    mount(readLogo, async ({ actor }) => {
      const { bytes, name, media } = await workshops.logo(actor.workshopId);
      return new FileAnswer(bytes, { name, media, shownInPage: true });
    }),
    mount(
      putLogo,
      async ({ actor, version, upload }) => presentWorkshop(await workshops.putLogo(actor, version, upload)),
      presentWorkshop,
    ),
    mount(
      removeLogo,
      async ({ actor, version }) => presentWorkshop(await workshops.removeLogo(actor, version)),
      presentWorkshop,
    ),
  ];
}
