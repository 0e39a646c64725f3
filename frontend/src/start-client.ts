import '@angular/localize/init';
import { loadTranslations } from '@angular/localize';
import { config } from 'zod/v4/core';
import { nextTask } from './app/core/next-task';
import { languageFor, languages } from './words/languages';

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
  // In pieces that each run in a task of their own: as one they would hold up a phone.
  await import('./app/client-app');
  await nextTask();
  const { bootstrapClient } = await import('./app/client-bootstrap');
  await bootstrapClient(catalogue);
}
