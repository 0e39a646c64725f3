import type { ClientIssue } from '#shared/client-page/client-issue-schema';
import type { ClientOverview } from '#shared/client-page/client-overview-schema';

const cover = (document: Document) => document.querySelector('.opening');

function write(document: Document, texts: Readonly<Record<string, string>>): void {
  for (const [part, text] of Object.entries(texts)) {
    const place = cover(document)?.querySelector<HTMLElement>(`[data-part=${part}]`);
    if (place) place.textContent = text;
  }
}

/** Writes the head of a paper over the page that is being opened: it can be read while the application is still on its way. */
export function writeOpeningHead(
  document: Document,
  { letterhead, issue, job, addressee, introduction }: ClientIssue,
): void {
  write(document, {
    ...{ name: letterhead.name, title: issue.title || job.title, addressee: addressee.name },
    // Where an answer was given already, it stands before the introduction.
    introduction: issue.state === 'open' ? introduction : '',
  });
}

/** The same of the list of all papers. */
export function writePapersHead(document: Document, { letterhead, client }: ClientOverview): void {
  write(document, { name: letterhead.name, client: client.name });
  cover(document)?.querySelector('[data-part=papers]')?.removeAttribute('hidden');
}

/** Takes the cover away, once the application has something to show. */
export const uncover = (document: Document): void => cover(document)?.remove();
