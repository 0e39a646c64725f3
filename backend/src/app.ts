import { openAccounts, type Accounts } from './accounts';
import { openAudit, type Audit } from './audit';
import { openWebServer, type WebServer } from './platform/http/web-server';
import type { MailCatcher } from './platform/mail/mail-catcher';
import type { Platform } from './platform/platform';

export interface App {
  readonly audit: Audit;
  readonly accounts: Accounts;
  readonly web: WebServer;
  /** Clears away what has had its time: sessions, keys, links, files that no row names. */
  readonly sweep: () => Promise<void>;
}

/** Joins the features: each is given what stands before it in the list, and brings its routes. */
export function openApp(platform: Platform, catcher?: MailCatcher): App {
  const audit = openAudit(platform);
  const accounts = openAccounts(platform, audit);
  const routes = [...audit.routes, ...accounts.routes];
  const web = openWebServer(platform, { routes, identities: accounts.identities, isPage: () => true, catcher });
  const sweep = async () => void (await Promise.all([web.sweep(), accounts.sweep(), platform.files.sweep()]));
  return { audit, accounts, web, sweep };
}
