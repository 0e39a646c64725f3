import { createHash, randomUUID } from 'node:crypto';
import { mkdir, readdir, readFile, writeFile } from 'node:fs/promises';
import type { AddressInfo } from 'node:net';
import { join } from 'node:path';
import type { Readable } from 'node:stream';
import { SMTPServer } from 'smtp-server';
import { headAndBody, mailParts } from './mail-parts';

/** A file that came with a mail. */
export interface CaughtEnclosure {
  readonly name: string;
  readonly media: string;
  readonly size_bytes: number;
  readonly sha256: string;
}

/** A mail as it was caught. */
export interface CaughtMail {
  readonly at: string;
  readonly headers: string;
  readonly text: string;
  /** The HTML as it is written; empty where there is none. */
  readonly html: string;
  readonly enclosures: readonly CaughtEnclosure[];
}

const mostShown = 50;
const hashOf = (bytes: Buffer): string => createHash('sha256').update(bytes).digest('hex');

async function whole(stream: Readable): Promise<Buffer> {
  const parts: Buffer[] = [];
  for await (const part of stream) parts.push(part as Buffer);
  return Buffer.concat(parts);
}

/** Reads a mail of ours, byte for byte as it came: its plain text, its HTML as it is written, and what was enclosed. */
export function readMail(source: string, at: string): CaughtMail {
  const parts = mailParts(source);
  const textOf = (media: string): string =>
    parts
      .find((part) => part.media === media && part.name === '')
      ?.bytes.toString('utf8')
      .replace(/\r\n/g, '\n') ?? '';
  const enclosures = parts
    .filter(({ name }) => name !== '')
    .map(({ name, media, bytes }) => ({ name, media, size_bytes: bytes.length, sha256: hashOf(bytes) }));
  const [head] = headAndBody(source);
  const headers = Buffer.from(head, 'latin1').toString('utf8');
  return { at, headers, text: textOf('text/plain'), html: textOf('text/html'), enclosures };
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
        .map(async (name) => readMail(await readFile(join(this.folder, name), 'latin1'), name.slice(0, 24))),
    );
  }

  private async keep(source: Buffer): Promise<void> {
    const at = new Date().toISOString();
    await writeFile(join(this.folder, `${at}-${randomUUID()}.eml`), source, { mode: 0o600 });
  }
}
