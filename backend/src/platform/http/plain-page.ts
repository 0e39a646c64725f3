const signs: Readonly<Record<string, string>> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };

export const escaped = (text: string): string => text.replace(/[&<>"']/g, (sign) => signs[sign] ?? '');

/** A page without script or style of its own, for readers of the machine's side. `body` is HTML, whatever came from outside escaped. */
export const plainPage = (title: string, body: string): string =>
  `<!doctype html><html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><title>${escaped(title)}</title></head><body><h1>${escaped(title)}</h1>${body}</body></html>`;
