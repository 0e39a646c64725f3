import { loadTranslations } from '@angular/localize';
import { forbidMadeFunctions } from './app/core/forbid-made-functions';
import { admitOwnWorkers } from './app/core/workers/admit-own-workers';
import { languageFor, languages } from './words/languages';

/** The words come first: texts marked for translation are read as soon as the application's files are. */
async function start(): Promise<void> {
  forbidMadeFunctions();
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
