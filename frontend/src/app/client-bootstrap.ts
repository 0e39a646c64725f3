import { createApplication } from '@angular/platform-browser';
import { Router } from '@angular/router';
import type { Catalogue } from '#shared/words/word-code';
import { ClientApp } from './client-app';
import { clientConfig } from './client-config';
import { nextTask } from './core/next-task';

/** Starts the pages of clients with the words of the person's language; each step in a task of its own, so that a tap never waits for all. */
export const bootstrapClient = async (catalogue: Catalogue): Promise<void> => {
  const application = await createApplication(clientConfig(catalogue));
  await nextTask();
  application.bootstrap(ClientApp);
  await nextTask();
  application.injector.get(Router).initialNavigation();
};
