import { setTimeout as pause } from 'node:timers/promises';
import type { RequestHandler } from 'express';
import type { Database } from '../database/database';

/** A database that is frozen gives no answer at all. */
const patience_milliseconds = 3000;

/** Whether the server takes requests: it stops saying so a moment before it stops. */
export class Readiness {
  private stopping = false;

  constructor(private readonly database: Database) {}

  stop(): void {
    this.stopping = true;
  }

  /** 200 while the process lives. */
  readonly alive: RequestHandler = (_request, response) => void response.json({ alive: true });

  /** 200 while requests are welcome and the database answers, else 503. */
  readonly ready: RequestHandler = async (_request, response) => {
    const answers = !this.stopping && (await this.databaseAnswers());
    response.status(answers ? 200 : 503).json({ ready: answers });
  };

  /** Asks clients to let go of their connection once the server is about to stop. */
  readonly letGo: RequestHandler = (_request, response, next) => {
    if (this.stopping) response.set('Connection', 'close');
    next();
  };

  private databaseAnswers(): Promise<boolean> {
    const answered = this.database.select('SELECT 1 AS one').then(
      () => true,
      () => false,
    );
    return Promise.race([answered, pause(patience_milliseconds, false, { ref: false })]);
  }
}
