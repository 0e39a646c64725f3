import '@angular/localize/init';
import { loadTranslations } from '@angular/localize';
import { config } from 'zod/v4/core';
import { nextTask } from './app/core/next-task';
import { languageFor, languages } from './words/languages';

/** What the application is made of, in pieces that each run in a task of their own: as one they would hold up a phone. `client-first-visit.mjs` names the same. */
const pieces: readonly (() => Promise<unknown>)[] = [
  () => import('./app/client-app'),
  () => import('#shared/words/say'),
  () => import('./app/core/formats/formats'),
  () => import('#shared/measure/shape-schema'),
  () => import('#shared/client-page/client-issues-endpoints'),
  () => import('./app/client-bootstrap'),
];

/** Starts the pages of clients; the words come first, as in `main.ts`. */
export async function startClient(): Promise<void> {
  // zod would otherwise try to make functions out of text, which the page's policy forbids.
  config({ jitless: true });
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
