import { randomInt } from 'node:crypto';
import { v7 as newId } from 'uuid';
import type { Clock } from '../clock/clock';
import type { Database } from '../database/database';
import { isInTransaction, outsideTransaction } from '../database/is-in-transaction';
import type { Log } from '../log/log';

/** One piece of work to do behind the scenes. `content` must be plain JSON; ids, never whole rows. */
export interface Task<Content = unknown> {
  readonly id: string;
  readonly workshopId: string | null;
  readonly kind: string;
  readonly content: Content;
  readonly attempts: number;
}

export interface NewTask {
  readonly workshopId: string | null;
  readonly kind: string;
  readonly content: object;
  readonly runAfter?: Date;
}

/** A task that was given up. */
export interface FailedTask {
  readonly id: string;
  readonly kind: string;
  readonly content: unknown;
  readonly attempts: number;
  readonly createdAt: Date;
  readonly failedAt: Date;
  readonly lastError: string;
}

export type TaskHandler<Content> = (content: Content, task: Task<Content>) => Promise<void>;

const mostAttempts = 12;
const pause_milliseconds = 1_000;

/** 10 s, 20 s, 40 s … up to six hours between attempts, a tenth more or less by chance so that failures do not march in step. */
const backOff_milliseconds = (attempts: number): number =>
  Math.min(100 * 2 ** (attempts - 1), 6 * 36_000) * randomInt(90, 110);

/** Kinds of work that wait for one another: all short ones together, each long one by itself. */
interface Lane {
  readonly kinds: string[];
  round: Promise<void> | undefined;
}

/**
 * Work that outlives its request. `add` writes it in the running transaction, so it happens exactly if the business step does; a
 * worker takes one row at a time (SKIP LOCKED, so several servers may), runs it in a transaction of its own, and strikes it off there.
 * Kinds that take long have a worker each, so that no letter waits for a plan; each holds one connection while it works.
 */
export class Tasks {
  private readonly handlers = new Map<string, TaskHandler<never>>();
  private readonly lanes: [Lane, ...Lane[]] = [{ kinds: [], round: undefined }];
  private timer: NodeJS.Timeout | undefined;
  private isStopping = false;

  constructor(
    private readonly database: Database,
    private readonly clock: Clock,
    private readonly log: Log,
  ) {}

  /** Says who does the work of a kind, and whether it takes long; a handler may run twice, so it must not mind. */
  register<Content>(kind: string, handler: TaskHandler<Content>, { isLong = false } = {}): void {
    this.handlers.set(kind, handler);
    if (isLong) this.lanes.push({ kinds: [kind], round: undefined });
    else this.lanes[0].kinds.push(kind);
  }

  async add(task: NewTask): Promise<string> {
    if (!isInTransaction()) throw new Error('a task is written in the transaction of the step that wants it');
    const id = newId();
    const now = this.clock.now();
    await this.database.execute(
      `INSERT INTO tasks (id, workshop_id, kind, content, attempts, run_after, created_at)
       VALUES (:id, :workshopId, :kind, :content, 0, :runAfter, :now)`,
      {
        id,
        workshopId: task.workshopId,
        kind: task.kind,
        content: JSON.stringify(task.content),
        runAfter: task.runAfter ?? now,
        now,
      },
    );
    return id;
  }

  start(): void {
    this.isStopping = false;
    const look = (lane: Lane): void => {
      lane.round ??= this.runDue(lane.kinds).finally(() => (lane.round = undefined));
    };
    this.timer = setInterval(() => this.lanes.forEach(look), pause_milliseconds);
    this.timer.unref();
  }

  /** Ends every worker once the task it has in hand is done; what is due besides waits for the next start. */
  async stop(): Promise<void> {
    clearInterval(this.timer);
    this.isStopping = true;
    await Promise.all(this.lanes.flatMap(({ round }) => round ?? []));
  }

  /** Runs whatever is due of some kinds, of all where none are named, one after the other until nothing is left. */
  async runDue(kinds: readonly string[] = [...this.handlers.keys()]): Promise<void> {
    try {
      while (!this.isStopping && (await outsideTransaction(() => this.runOne(kinds))));
    } catch (error) {
      this.log.error({ error }, 'the tasks could not be read');
    }
  }

  /** Tasks that failed for the last time, for the eyes of whoever runs the server. */
  failed(): Promise<{ id: string; kind: string; lastError: string }[]> {
    return this.database.select(
      'SELECT id, kind, last_error AS lastError FROM tasks WHERE failed_at IS NOT NULL ORDER BY id LIMIT 1000',
    );
  }

  /** The tasks of one kind of a workshop that were given up, the newest first, at most 200. */
  failedOf(workshopId: string, kind: string): Promise<FailedTask[]> {
    return this.database.select<FailedTask>(
      `SELECT id, kind, content, attempts, created_at AS createdAt, failed_at AS failedAt, last_error AS lastError FROM tasks
       WHERE failed_at IS NOT NULL AND workshop_id = :workshopId AND kind = :kind ORDER BY id DESC LIMIT 200`,
      { workshopId, kind },
    );
  }

  /** Takes up again what was given up, with all its attempts before it; answers whether there was such a task. */
  async again(task: { workshopId: string; kind: string; id: string }): Promise<boolean> {
    const taken = await this.database.execute(
      `UPDATE tasks SET failed_at = NULL, attempts = 0, run_after = :now
       WHERE id = :id AND workshop_id = :workshopId AND kind = :kind AND failed_at IS NOT NULL`,
      { ...task, now: this.clock.now() },
    );
    return taken > 0;
  }

  private async runOne(kinds: readonly string[]): Promise<boolean> {
    const failure: { task?: Task; error?: unknown } = {};
    const ran = await this.database
      .transaction(async () => {
        const task = await this.take(kinds);
        if (!task) return false;
        failure.task = task;
        await this.perform(task);
        await this.database.execute('DELETE FROM tasks WHERE id = :id', { id: task.id });
        return true;
      })
      .catch((error: unknown) => {
        if (!failure.task) throw error;
        failure.error = error;
        return true;
      });
    if (failure.task && 'error' in failure) await this.postpone(failure.task, failure.error);
    return ran;
  }

  /**
   * Locks the first task that is due and in nobody's hands. What is due is read first (more than there are workers), and then locked by its id alone: a
   * locking search would hold every row it passes, those of other kinds among them, for as long as the task takes.
   */
  private async take(kinds: readonly string[]): Promise<Task | undefined> {
    const now = this.clock.now();
    const due = await this.database.select<{ id: string }>(
      `SELECT id FROM tasks WHERE failed_at IS NULL AND run_after <= :now AND kind IN (:kinds)
       ORDER BY run_after, id LIMIT 50`,
      { now, kinds: [...kinds, ''] },
    );
    for (const { id } of due) {
      const [task] = await this.database.select<Task>(
        `SELECT id, workshop_id AS workshopId, kind, content, attempts FROM tasks
         WHERE id = :id AND failed_at IS NULL AND run_after <= :now FOR UPDATE SKIP LOCKED`,
        { id, now },
      );
      if (task) return task;
    }
    return undefined;
  }

  private async perform(task: Task): Promise<void> {
    const handler = this.handlers.get(task.kind) as TaskHandler<unknown> | undefined;
    await handler?.(task.content, task);
  }

  private async postpone(task: Task, error: unknown): Promise<void> {
    const attempts = task.attempts + 1;
    const over = attempts >= mostAttempts;
    const now = this.clock.now();
    this.log.warn(
      { task: task.id, kind: task.kind, workshopId: task.workshopId, attempts, over, error },
      'a task failed',
    );
    await this.database.execute(
      'UPDATE tasks SET attempts = :attempts, run_after = :runAfter, failed_at = :failedAt, last_error = :lastError WHERE id = :id',
      {
        id: task.id,
        attempts,
        runAfter: new Date(now.getTime() + backOff_milliseconds(attempts)),
        failedAt: over ? now : null,
        lastError: String((error as Error).message ?? error).slice(0, 500),
      },
    );
  }
}
