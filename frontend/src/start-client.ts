import '@angular/localize/init';
import { loadTranslations } from '@angular/localize';
import { forbidMadeFunctions } from './app/core/forbid-made-functions';
import { nextTask } from './app/core/next-task';
import { languageFor, languages } from './words/languages';

/** What the application is made of, in pieces that each run in a task of their own: as one they would hold up a phone. `client-first-visit.mjs` names the same. */
const pieces: readonly (() => Promise<unknown>)[] = [
  () => import('./app/client-app'),
  () => import('#shared/words/say'),
  () => import('./app/core/formats/formats'),
  () => import('./app/client-bootstrap'),
];

/** Starts the pages of clients; the words come first, as in `main.ts`. */
export async function startClient(): Promise<void> {
  forbidMadeFunctions();
  const language = languageFor(navigator.languages);
  const [catalogue, templates] = await Promise.all([
    languages[language].catalogue(),
    languages[language].templates?.(),
  ]);
  if (templates) loadTranslations({ ...templates });
  document.documentElement.lang = language;
  for (const piece of pieces) {
    await piece();
    await nextTask();
  }
  const { bootstrapClient } = await import('./app/client-bootstrap');
  await bootstrapClient(catalogue);
}
