import { openAccounts } from './accounts';
import { openAudit } from './audit';
import { openWebServer, type WebServer } from './platform/http/web-server';
import type { Platform } from './platform/platform';

export interface App {
  readonly web: WebServer;
}

/** Joins the features: each is given what stands before it in the list, and brings its routes. */
export function openApp(platform: Platform): App {
  const audit = openAudit(platform);
  const accounts = openAccounts(platform, audit);
  const routes = [...audit.routes, ...accounts.routes];
  return { web: openWebServer(platform, { routes, identities: accounts.identities, isPage: () => true }) };
}
