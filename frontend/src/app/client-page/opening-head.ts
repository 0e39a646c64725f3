import type { ClientIssue } from '#shared/client-page/client-issue-schema';

const cover = (document: Document) => document.querySelector('.opening');

/** Writes the head of a paper over the page that is being opened: it can be read while the application is still on its way. */
export function writeOpeningHead(
  document: Document,
  { letterhead, issue, job, addressee, introduction }: ClientIssue,
): void {
  const texts = {
    ...{ name: letterhead.name, title: issue.title || job.title, addressee: addressee.name },
    // Where an answer was given already, it stands before the introduction.
    introduction: issue.state === 'open' ? introduction : '',
  };
  for (const [part, text] of Object.entries(texts)) {
    const place = cover(document)?.querySelector(`[data-part=${part}]`);
    if (place) place.textContent = text;
  }
}

/** Takes the cover away, once the application has something to show. */
export const uncover = (document: Document): void => cover(document)?.remove();
