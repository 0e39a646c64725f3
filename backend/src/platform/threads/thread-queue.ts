import { Worker } from 'node:worker_threads';
import { TooLarge } from '#shared/money/too-large';
import { Rejection } from '#shared/problems/rejection';
import type { ThreadFile } from './thread-file';

interface Waiting<Question, Answer> {
  readonly question: Question;
  readonly resolve: (answer: Answer) => void;
  readonly reject: (error: Error) => void;
}

interface ThreadFailure {
  readonly error: string;
  readonly isTooLarge?: boolean;
}

/** What a thread sends back: its answer, or why there is none. */
export type ThreadReply<Answer> = { readonly answer: Answer } | ThreadFailure;

/** An error loses its class on its way out of a thread. */
const failureOf = ({ error, isTooLarge }: ThreadFailure): Error =>
  isTooLarge ? new TooLarge(error) : new Error(error);

/** How long a question may take, and what is said of one that took longer. */
export interface TimeLimit {
  readonly milliseconds: number;
  readonly failure: () => Error;
}

const mostWaiting = 200;
const idle_milliseconds = 20_000;
const retryAfter_seconds = 10;

/**
 * Costly work in one thread of its own, question by question in the order they came, so that everybody else is answered meanwhile.
 * More than 200 waiting are refused; a thread that has nothing to do ends, and one that failed, or took longer than it may, is begun
 * anew for the next question.
 */
export class ThreadQueue<Question, Answer> {
  private readonly waiting: Waiting<Question, Answer>[] = [];
  private running: Waiting<Question, Answer> | undefined;
  private thread: Worker | undefined;
  private idle: NodeJS.Timeout | undefined;
  private late: NodeJS.Timeout | undefined;

  constructor(
    private readonly start: () => ThreadFile,
    private readonly most: { readonly waiting?: number; readonly time?: TimeLimit } = {},
  ) {}

  ask(question: Question): Promise<Answer> {
    if (this.waiting.length >= (this.most.waiting ?? mostWaiting))
      return Promise.reject(new Rejection('unavailable', 'problem-busy', { retryAfter_seconds }));
    return new Promise((resolve, reject) => {
      this.waiting.push({ question, resolve, reject });
      this.next();
    });
  }

  private next(): void {
    if (this.running) return;
    this.running = this.waiting.shift();
    if (!this.running) return this.rest();
    clearTimeout(this.idle);
    this.thread ??= this.begin();
    this.thread.ref();
    this.thread.postMessage(this.running.question);
    this.watch(this.thread);
  }

  private watch(thread: Worker): void {
    const { time } = this.most;
    if (!time) return;
    this.late = setTimeout(() => {
      void thread.terminate();
      this.lose(thread, time.failure());
    }, time.milliseconds);
  }

  private begin(): Worker {
    const { file, options } = this.start();
    const thread = new Worker(file, options);
    thread.on('message', (reply: ThreadReply<Answer>) => this.settle(thread, reply));
    thread.on('error', (error) => this.lose(thread, error));
    thread.on('exit', () => this.lose(thread, new Error('the thread ended before it had answered')));
    return thread;
  }

  private settle(thread: Worker, reply: ThreadReply<Answer>): void {
    if (this.thread !== thread) return;
    const running = this.finish();
    if ('answer' in reply) running?.resolve(reply.answer);
    else running?.reject(failureOf(reply));
    this.next();
  }

  private lose(thread: Worker, error: Error): void {
    if (this.thread !== thread) return;
    this.thread = undefined;
    const running = this.finish();
    if (!running) return;
    running.reject(error);
    this.next();
  }

  private finish(): Waiting<Question, Answer> | undefined {
    const { running } = this;
    clearTimeout(this.late);
    this.running = undefined;
    return running;
  }

  /** Nothing to do: the process may end, and after a while the thread does. */
  private rest(): void {
    const { thread } = this;
    thread?.unref();
    this.idle = setTimeout(() => {
      if (this.running || this.thread !== thread) return;
      this.thread = undefined;
      void thread?.terminate();
    }, idle_milliseconds);
    this.idle.unref();
  }
}
