import { provideHttpClient, withFetch } from '@angular/common/http';
import {
  type ApplicationConfig,
  ErrorHandler,
  inject,
  provideAppInitializer,
  provideBrowserGlobalErrorListeners,
} from '@angular/core';
import {
  TitleStrategy,
  provideRouter,
  withComponentInputBinding,
  withInMemoryScrolling,
  withRouterConfig,
} from '@angular/router';
import type { Catalogue } from '#shared/words/word-code';
import { AccountsSession } from './accounts';
import { appRoutes } from './app-routes';
import { CATALOGUE } from './core/formats/catalogue';
import { Notices } from './core/problems/notices';
import { PageErrorHandler } from './core/problems/page-error-handler';
import { ProblemError } from './core/problems/problem-error';
import { PageTitle } from './core/routing/page-title';
import { SESSION_PORT } from './core/session/session-port';
import { Theme } from './core/theme/theme';
import { laterWidgets } from './later-widgets';

/** Asks who is here before the first page is chosen; an unreachable server is said, and everybody is a stranger until it answers. */
async function begin(): Promise<void> {
  const notices = inject(Notices);
  inject(Theme);
  await inject(SESSION_PORT)
    .read()
    .catch((error: unknown) => {
      if (!(error instanceof ProblemError)) throw error;
      notices.complain(error.message);
    });
}

export const appConfig = (catalogue: Catalogue): ApplicationConfig => ({
  providers: [
    provideBrowserGlobalErrorListeners(),
    provideRouter(
      appRoutes,
      withComponentInputBinding(),
      withInMemoryScrolling({ scrollPositionRestoration: 'enabled', anchorScrolling: 'disabled' }),
      withRouterConfig({ paramsInheritanceStrategy: 'always' }),
    ),
    provideHttpClient(withFetch()),
    provideAppInitializer(begin),
    { provide: CATALOGUE, useValue: catalogue },
    { provide: ErrorHandler, useClass: PageErrorHandler },
    PageTitle,
    { provide: TitleStrategy, useExisting: PageTitle },
    { provide: SESSION_PORT, useExisting: AccountsSession },
    laterWidgets,
  ],
});
