/** One part of a mail that has no parts itself, its bytes as they were before they were sent. */
export interface MailPart {
  readonly media: string;
  /** The name of an enclosed file; empty for what is read at once. */
  readonly name: string;
  readonly bytes: Buffer;
}

const decoders: Readonly<Record<string, (body: string) => Buffer>> = {
  base64: (body) => Buffer.from(body, 'base64'),
  'quoted-printable': (body) => {
    const joined = body.replace(/=\r?\n/g, '');
    return Buffer.from(
      joined.replace(/=([0-9A-F]{2})/g, (_, code: string) => String.fromCharCode(parseInt(code, 16))),
      'latin1',
    );
  },
};

/** The head of a mail or of a part, its folded lines as they came, and what follows it. */
export function headAndBody(source: string): [string, string] {
  const gap = /\r?\n\r?\n/.exec(source);
  return gap ? [source.slice(0, gap.index), source.slice(gap.index + gap[0].length)] : [source, ''];
}

/** The value of a header, unfolded; empty where there is none. */
const header = (head: string, name: string): string =>
  (new RegExp(`^${name}:[ \\t]*((?:.*\\r?\\n[ \\t]+)*.*)`, 'im').exec(head)?.[1] ?? '')
    .replace(/\r?\n[ \t]+/g, ' ')
    .trim();

function nameOf(head: string): string {
  const disposition = header(head, 'content-disposition');
  const encoded = /filename\*0?\*?=utf-8''([^;]+)/i.exec(disposition)?.[1];
  if (encoded) return decodeURIComponent(encoded);
  return /filename="?([^";]+)"?/i.exec(disposition)?.[1] ?? '';
}

function inner(body: string, boundary: string): string[] {
  const [, ...parts] = `\r\n${body}`.split(
    new RegExp(`\\r?\\n--${boundary.replace(/[^\w]/g, '\\$&')}(?:--)?[ \\t]*(?:\\r?\\n|$)`),
  );
  return parts.filter((part) => part.trim() !== '');
}

/** Takes a mail (or a part of one) apart, for mails of our own making: read as latin1, so that every byte is one letter. */
export function mailParts(source: string): MailPart[] {
  const [head, body] = headAndBody(source);
  const media = header(head, 'content-type');
  const boundary = /boundary="?([^";]+)"?/i.exec(media)?.[1];
  if (/^multipart\//i.test(media) && boundary) return inner(body, boundary).flatMap(mailParts);
  const decode = decoders[header(head, 'content-transfer-encoding').toLowerCase()];
  const bytes = decode?.(body) ?? Buffer.from(body, 'latin1');
  return [{ media: media.split(';')[0]?.trim().toLowerCase() || 'text/plain', name: nameOf(head), bytes }];
}
