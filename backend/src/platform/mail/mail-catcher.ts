import { randomUUID } from 'node:crypto';
import { mkdir, readdir, readFile, writeFile } from 'node:fs/promises';
import type { AddressInfo } from 'node:net';
import { join } from 'node:path';
import type { Readable } from 'node:stream';
import { SMTPServer } from 'smtp-server';

/** A mail as it was caught. */
export interface CaughtMail {
  readonly at: string;
  readonly headers: string;
  readonly text: string;
}

const mostShown = 50;

async function whole(stream: Readable): Promise<Buffer> {
  const parts: Buffer[] = [];
  for await (const part of stream) parts.push(part as Buffer);
  return Buffer.concat(parts);
}

const decoders: Readonly<Record<string, (body: string) => string>> = {
  base64: (body) => Buffer.from(body, 'base64').toString('utf8'),
  'quoted-printable': (body) => {
    const joined = body.replace(/=\r?\n/g, '');
    const bytes = joined.replace(/=([0-9A-F]{2})/g, (_, code: string) => String.fromCharCode(parseInt(code, 16)));
    return Buffer.from(bytes, 'latin1').toString('utf8');
  },
};

/** Reads the plain text of a mail of ours; a mail of several parts is shown as it came. */
export function readMail(source: string, at: string): CaughtMail {
  const [headers = '', ...rest] = source.split(/\r?\n\r?\n/);
  const body = rest.join('\n\n');
  const encoding = /^content-transfer-encoding:\s*(\S+)/im.exec(headers)?.[1]?.toLowerCase() ?? '';
  return { at, headers, text: decoders[encoding]?.(body) ?? body };
}

/** Takes in every mail on a port of loopback and keeps it in a folder, for machines that have no mail server. Nothing leaves. */
export class MailCatcher {
  private readonly server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS', 'AUTH'],
    logger: false,
    onData: (stream, _session, done) => {
      whole(stream)
        .then((source) => this.keep(source))
        .then(() => done(), done);
    },
  });

  constructor(private readonly folder: string) {}

  /** Starts and answers the address to send to. */
  async start(): Promise<string> {
    await mkdir(this.folder, { recursive: true, mode: 0o700 });
    await new Promise<void>((resolve, reject) => {
      this.server.once('error', reject);
      this.server.listen(0, '127.0.0.1', () => resolve());
    });
    return `smtp://127.0.0.1:${(this.server.server.address() as AddressInfo).port}`;
  }

  stop(): Promise<void> {
    return new Promise((resolve) => this.server.close(() => resolve()));
  }

  /** The newest mails first. */
  async mails(): Promise<CaughtMail[]> {
    const names = (await readdir(this.folder))
      .filter((name) => name.endsWith('.eml'))
      .sort()
      .reverse();
    return Promise.all(
      names
        .slice(0, mostShown)
        .map(async (name) => readMail(await readFile(join(this.folder, name), 'utf8'), name.slice(0, 24))),
    );
  }

  private async keep(source: Buffer): Promise<void> {
    const at = new Date().toISOString();
    await writeFile(join(this.folder, `${at}-${randomUUID()}.eml`), source, { mode: 0o600 });
  }
}
