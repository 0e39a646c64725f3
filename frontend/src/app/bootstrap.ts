import { bootstrapApplication } from '@angular/platform-browser';
import type { Catalogue } from '#shared/words/word-code';
import { App } from './app';
import { appConfig } from './app-config';

/** Starts the application with the words of the person's language; everything marked for translation is read after they are there. */
export const bootstrap = async (catalogue: Catalogue): Promise<void> => {
  await bootstrapApplication(App, appConfig(catalogue));
};
