import { loadTranslations } from '@angular/localize';
import { config } from 'zod/v4/core';
import { admitOwnWorkers } from './app/core/workers/admit-own-workers';
import { languageFor, languages } from './words/languages';

/** The words come first: texts marked for translation are read as soon as the application's files are. */
async function start(): Promise<void> {
  // zod would otherwise try to make functions out of text, which the page's policy forbids.
  config({ jitless: true });
  admitOwnWorkers();
  const language = languageFor(navigator.languages);
  const [catalogue, templates] = await Promise.all([
    languages[language].catalogue(),
    languages[language].templates?.(),
  ]);
  if (templates) loadTranslations({ ...templates });
  document.documentElement.lang = language;
  const { bootstrap } = await import('./app/bootstrap');
  await bootstrap(catalogue);
}

start().catch((error: unknown) => console.error(error));
