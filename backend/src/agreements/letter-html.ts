import type { WorkshopSettingsRow } from '../accounts';
import { escaped } from '../platform/http/plain-page';

type Sender = Pick<WorkshopSettingsRow, 'name' | 'addressLines' | 'telephone'>;

const face = 'font-family:Georgia,serif;font-size:16px;line-height:1.5;color:#2b2118';
const foot = 'margin-top:32px;padding-top:12px;border-top:1px solid #b08d3c;font-size:14px;color:#5c5148';

/** A letter as HTML: the workshop's name over it, its address beneath. No picture, no script, nothing that is fetched. */
export function letterHtml(
  { name, addressLines, telephone }: Sender,
  letter: { subject: string; body: string },
): string {
  // Many an address begins with the name already.
  const lines = new Set([name, ...addressLines, telephone].filter((line) => line.trim() !== ''));
  const address = [...lines].map(escaped);
  return [
    `<!doctype html><html lang="en"><head><meta charset="utf-8"><title>${escaped(letter.subject)}</title></head>`,
    `<body style="margin:0;padding:24px;background:#fff"><div style="max-width:36em;${face}">`,
    `<p style="font-size:20px">${escaped(name)}</p>`,
    letter.body,
    `<p style="${foot}">${address.join('<br>')}</p>`,
    '</div></body></html>',
  ].join('\n');
}
