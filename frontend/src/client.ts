import { askedAhead } from './app/client-page/asked-ahead';
import { startFirstFormatWorker } from './app/core/formats/start-first-format-worker';
import { oncePainted } from './app/core/once-painted';
import { admitOwnWorkers } from './app/core/workers/admit-own-workers';

/** So long the application waits for what is read before it; on a line as slow as that it would rather be on its way. */
const longest_ms = 3000;

const inTime = (longest_ms: number) => new Promise<undefined>((resolve) => setTimeout(resolve, longest_ms));

/** A help and no more: without it the application makes its first format by itself. */
function prepareFormats(): void {
  try {
    admitOwnWorkers();
    startFirstFormatWorker();
  } catch (error) {
    console.error(error);
  }
}

/**
 * The pages of clients, an application of its own: nothing of the workshop's travels with them. What the first page asks is asked, and its
 * head is shown, before the files of the application are fetched at all: so these do not stand in its way.
 */
async function start(): Promise<void> {
  const opened = askedAhead.begin(location).then((page) => oncePainted(window).then(() => page));
  prepareFormats();
  const page = await Promise.race([opened, inTime(longest_ms)]);
  // Where the visit led: its secret stays in no history, and the application begins at the paper itself.
  if (page) history.replaceState(null, '', page);
  const files = document.querySelector<HTMLTemplateElement>('template[data-files]');
  if (files) document.head.append(files.content);
  const { startClient } = await import('./start-client');
  await startClient();
}

start().catch((error: unknown) => console.error(error));
