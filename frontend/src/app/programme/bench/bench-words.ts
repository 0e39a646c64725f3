import { Injectable, inject } from '@angular/core';
import type { BenchTask } from '#shared/programme/bench-task';
import { Formats } from '../../core/formats/formats';
import { NOW } from '../../core/now';
import { TaskWords } from '../plan/task-words';

/** What is said of a task at the bench; nothing of cost. */
@Injectable({ providedIn: 'root' })
export class BenchWords {
  private readonly formats = inject(Formats);
  private readonly now = inject(NOW);
  private readonly tasks = inject(TaskWords);

  title({ kind, name, lot, coat, coats }: BenchTask): string {
    if (kind === 'carving') return $localize`Carve: ${lot}:member:`;
    const [number, all] = [coat, coats].map((figure) => this.formats.number(figure, 0));
    return coats > 1 ? $localize`${name}:step:, coat ${number}:coat: of ${all}:coats:` : name;
  }

  /** What it is on, and with whom. */
  about({ kind, lot, piece, jobTitle, portion, portions, with: others }: BenchTask): string {
    const [number, all] = [portion, portions].map((figure) => this.formats.number(figure, 0));
    return [
      ...(kind === 'carving' ? [] : [lot]),
      ...(portions > 1 ? [$localize`portion ${number}:portion: of ${all}:portions:`] : []),
      piece === jobTitle ? piece : `${piece}, ${jobTitle}`,
      ...(others.length > 0 ? [$localize`with ${others.join(', ')}:people:`] : []),
    ].join(' · ');
  }

  length({ handsOn_minutes }: BenchTask): string {
    return this.formats.figure('minutes', handsOn_minutes);
  }

  /** What it waits for, or until when it can be done. */
  state(task: BenchTask): string {
    if (task.state === 'finished') return $localize`finished`;
    const waits = this.tasks.waits(task.waits).join(' ');
    if (task.state === 'drying' && task.readyAt) return $localize`drying, ready ${this.moment(task.readyAt)}:time:`;
    if (task.state === 'waiting') return waits;
    return task.windowClosesAt ? this.until(task.windowClosesAt) : '';
  }

  until(at: string): string {
    return $localize`good until ${this.moment(at)}:time:`;
  }

  time(at: string): string {
    return this.formats.time(at);
  }

  /** The time alone, with its day where that is another than today. */
  moment(at: string): string {
    const [own, today] = [this.formats.dayOf(at), this.formats.dayOf(this.now())];
    return own === today ? this.time(at) : `${this.formats.dayOf(at, 'weekday')}, ${this.time(at)}`;
  }
}
