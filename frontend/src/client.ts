import { askedAhead } from './app/client-page/asked-ahead';
import { oncePainted } from './app/core/once-painted';

/** So long the application waits for what is read before it; on a line as slow as that it would rather be on its way. */
const longest_ms = 3000;

/**
 * The pages of clients, an application of its own: nothing of the workshop's travels with them. What the first page asks is asked, and its
 * head is shown, before the files of the application are fetched at all: so these do not stand in its way.
 */
async function start(): Promise<void> {
  const opened = askedAhead.begin(location).then(() => oncePainted(window));
  await Promise.race([opened, new Promise((resolve) => setTimeout(resolve, longest_ms))]);
  const files = document.querySelector<HTMLTemplateElement>('template[data-files]');
  if (files) document.head.append(files.content);
  const { startClient } = await import('./start-client');
  await startClient();
}

start().catch((error: unknown) => console.error(error));
