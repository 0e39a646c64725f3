import { askedAhead } from './app/client-page/asked-ahead';

/**
 * The pages of clients, an application of its own: nothing of the workshop's travels with them. What the first page asks is asked before
 * the application is here.
 */
askedAhead.begin(location);

import('./start-client').then(({ startClient }) => startClient()).catch((error: unknown) => console.error(error));
