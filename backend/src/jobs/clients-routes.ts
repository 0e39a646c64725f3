import { keepClient, listClients, readClient, removeClient } from '#shared/jobs/clients-endpoints';
import { mount, type Route } from '../platform/http/mount';
import { presentClient } from './client-presenter';
import type { ClientService } from './client-service';

export const clientsRoutes = (clients: ClientService): Route[] => [
  mount(listClients, async ({ actor, query }) => {
    const page = await clients.page(actor.workshopId, query);
    return { ...page, items: page.items.map(presentClient) };
  }),
  mount(readClient, async ({ actor, params }) => presentClient(await clients.get(actor.workshopId, params.clientId))),
  mount(
    keepClient,
    async ({ actor, params, version, body }) =>
      presentClient(await clients.keep(actor, { id: params.clientId, version }, body)),
    presentClient,
  ),
  mount(
    removeClient,
    ({ actor, params, version }) => clients.remove(actor, { id: params.clientId, version }),
    presentClient,
  ),
];
