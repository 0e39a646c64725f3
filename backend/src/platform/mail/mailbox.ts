import { createTransport, type Transporter } from 'nodemailer';
import type { Config } from '../config/config';
import type { Task, Tasks } from '../tasks/tasks';

/** A mail of plain text to one person. */
export interface Letter {
  readonly to: { readonly name: string; readonly email: string };
  readonly subject: string;
  readonly text: string;
  readonly replyTo?: string;
}

const kind = 'mail';
const oneLine = (text: string): string => text.replace(/[\r\n\u0000]+/g, ' ').trim();

/** Posts mail through the tasks: it leaves only if the step that wrote it was committed, and again with the same Message-ID if unsure. */
export class Mailbox {
  private transport: Transporter | undefined;

  constructor(
    private readonly config: Config,
    private readonly tasks: Tasks,
  ) {
    tasks.register<Letter>(kind, (letter, task) => this.deliver(letter, task));
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
    await this.tasks.add({ workshopId, kind, content: letter });
  }

  private async deliver(letter: Letter, task: Task<Letter>): Promise<void> {
    if (!this.transport) throw new Error('no mail server is connected');
    await this.transport.sendMail({
      from: this.config.mailFrom,
      to: { name: oneLine(letter.to.name), address: letter.to.email },
      subject: oneLine(letter.subject),
      text: letter.text,
      messageId: `<${task.id}@bolewright.invalid>`,
      ...(letter.replyTo ? { replyTo: letter.replyTo } : {}),
    });
  }
}
