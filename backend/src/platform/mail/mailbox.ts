import { createTransport, type SendMailOptions, type Transporter } from 'nodemailer';
import { Rejection } from '#shared/problems/rejection';
import type { Config } from '../config/config';
import type { FileStore } from '../files/file-store';
import type { FailedTask, Task, Tasks } from '../tasks/tasks';
import type { Letter } from './letter';
import { openedLetter, sealedLetter, type SealedLetter } from './sealed-letter';

export type { Letter } from './letter';

/** A letter nobody could be handed. */
export interface GivenUpLetter extends Omit<FailedTask, 'kind' | 'content'> {
  readonly to: string;
  readonly subject: string;
}

const kind = 'mail';
const oneLine = (text: string): string => text.replace(/[\r\n\u0000]+/g, ' ').trim();

/** Posts mail through the tasks: it leaves only if the step that wrote it was committed, and again with the same Message-ID if unsure. */
export class Mailbox {
  private transport: Transporter | undefined;

  constructor(
    private readonly config: Config,
    private readonly tasks: Tasks,
    private readonly files: Pick<FileStore, 'read'>,
  ) {
    tasks.register<SealedLetter>(kind, (content, task) => this.deliver(this.opened(content), task));
  }

  /** Where mail goes: the configured server, or the catcher a development server starts. */
  connect(url: string, checksPeer = true): void {
    this.transport = createTransport({
      url,
      ...(checksPeer ? {} : { ignoreTLS: true }),
      connectionTimeout: 10_000,
      disableFileAccess: true,
      disableUrlAccess: true,
    } as never);
  }

  /** Writes a mail into the running transaction. */
  async post(workshopId: string | null, letter: Letter): Promise<void> {
    if (letter.enclosures && workshopId === null) throw new Error('only a letter of a workshop encloses files');
    await this.tasks.add({ workshopId, kind, content: sealedLetter(letter, this.config.sessionSecret) });
  }

  /** The letters of a workshop that were given up, the newest first. */
  async givenUp(workshopId: string): Promise<GivenUpLetter[]> {
    const failed = await this.tasks.failedOf(workshopId, kind);
    return failed.map(({ content, kind: _, ...task }) => ({ ...task, ...this.told(content as SealedLetter) }));
  }

  /** Tries a letter again that was given up, as if it were new; refused as not found where there is none. */
  async sendAgain(workshopId: string, id: string): Promise<void> {
    if (!(await this.tasks.again({ workshopId, kind, id }))) throw new Rejection('not-found', 'problem-not-found');
  }

  private opened(content: SealedLetter): Letter {
    return openedLetter(content, this.config.sessionSecret);
  }

  /** To whom and about what; empty for one that was sealed with a secret nobody has any more. */
  private told(content: SealedLetter): { to: string; subject: string } {
    try {
      const { to, subject } = this.opened(content);
      return { to: to.email, subject: oneLine(subject) };
    } catch {
      return { to: '', subject: '' };
    }
  }

  private async deliver(letter: Letter, task: Task<SealedLetter>): Promise<void> {
    if (!this.transport) throw new Error('no mail server is connected');
    const { from, html, replyTo } = letter;
    await this.transport.sendMail({
      from: from === undefined ? this.config.mailFrom : { name: oneLine(from), address: this.config.mailFrom },
      to: { name: oneLine(letter.to.name), address: letter.to.email },
      subject: oneLine(letter.subject),
      text: letter.text,
      messageId: `<${task.id}@bolewright.invalid>`,
      ...(html === undefined ? {} : { html }),
      ...(replyTo ? { replyTo } : {}),
      attachments: await this.enclosed(letter, task.workshopId ?? ''),
    });
  }

  private enclosed({ enclosures = [] }: Letter, workshopId: string): Promise<SendMailOptions['attachments'] & object> {
    return Promise.all(
      enclosures.map(async ({ fileId }) => {
        const { name, media, bytes } = await this.files.read(workshopId, fileId);
        return { filename: oneLine(name), contentType: media, content: bytes };
      }),
    );
  }
}
