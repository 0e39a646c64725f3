import type { Response } from 'express';
import { plainPolicy } from './headers';

const signs: Readonly<Record<string, string>> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };

export const escaped = (text: string): string => text.replace(/[&<>"']/g, (sign) => signs[sign] ?? '');

const plainPage = (title: string, body: string): string =>
  `<!doctype html><html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width, initial-scale=1"><title>${escaped(title)}</title><link rel="stylesheet" href="/plain.css"></head><body><h1>${escaped(title)}</h1>${body}</body></html>`;

/** A page without script, for readers of the machine's side. `body` is HTML, whatever came from outside escaped. */
export const sendPlainPage = (response: Response, title: string, body: string): void =>
  void response.set('Content-Security-Policy', plainPolicy).type('html').send(plainPage(title, body));
