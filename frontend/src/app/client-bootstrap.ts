import { bootstrapApplication } from '@angular/platform-browser';
import type { Catalogue } from '#shared/words/word-code';
import { ClientApp } from './client-app';
import { clientConfig } from './client-config';

/** Starts the pages of clients with the words of the person's language. */
export const bootstrapClient = async (catalogue: Catalogue): Promise<void> => {
  await bootstrapApplication(ClientApp, clientConfig(catalogue));
};
