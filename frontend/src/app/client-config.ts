import { provideHttpClient, withFetch, withInterceptors } from '@angular/common/http';
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
  withDisabledInitialNavigation,
  withInMemoryScrolling,
} from '@angular/router';
import type { Catalogue } from '#shared/words/word-code';
import { clientPageRoutes } from './client-page/client-page-routes';
import { ClientSession, answeredAhead } from './client-page';
import { CATALOGUE } from './core/formats/catalogue';
import { PageErrorHandler } from './core/problems/page-error-handler';
import { PageTitle } from './core/routing/page-title';
import { SESSION_PORT } from './core/session/session-port';
import { Theme } from './core/theme/theme';

/** The application of clients: their pages alone, and nobody signed in. */
export const clientConfig = (catalogue: Catalogue): ApplicationConfig => ({
  providers: [
    provideBrowserGlobalErrorListeners(),
    provideRouter(
      [{ path: 'client', children: clientPageRoutes }],
      withComponentInputBinding(),
      withDisabledInitialNavigation(),
      withInMemoryScrolling({ scrollPositionRestoration: 'enabled' }),
    ),
    provideHttpClient(withFetch(), withInterceptors([answeredAhead])),
    provideAppInitializer(() => void inject(Theme)),
    provideAppInitializer(() => inject(SESSION_PORT).read()),
    { provide: CATALOGUE, useValue: catalogue },
    { provide: ErrorHandler, useClass: PageErrorHandler },
    PageTitle,
    { provide: TitleStrategy, useExisting: PageTitle },
    { provide: SESSION_PORT, useExisting: ClientSession },
  ],
});
