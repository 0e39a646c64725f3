import { Injectable, inject } from '@angular/core';
import { dayOfMinutes, instantOf, type ProgrammeFrame } from '#shared/programme/programme-frame';
import type { ProgrammeItem } from '#shared/programme/programme-item';
import type { PlannedTask } from '#shared/programme/programme-plan';
import type { Reason } from '#shared/words/reason';
import { Formats } from '../../core/formats/formats';
import { Words } from '../../core/formats/words';

/** What a task's story is told from. */
export interface ToldTask {
  readonly item: ProgrammeItem;
  readonly task: PlannedTask;
  readonly people: ReadonlyMap<string, string>;
  readonly frame: ProgrammeFrame;
  readonly state: 'planned' | 'started' | 'finished';
  readonly isPinned: boolean;
}

/** Puts what there is to tell of a task into sentences. */
@Injectable({ providedIn: 'root' })
export class TaskWords {
  private readonly formats = inject(Formats);
  private readonly words = inject(Words);

  /** "Gesso 2 of 8", "Carving by a carver", with the portion where there are several. */
  name(item: ProgrammeItem): string {
    const name = item.kind === 'carving' ? $localize`Carving, ${item.grade}:grade:` : item.name;
    const [coat, coats] = [item.coat, item.coats].map((count) => this.formats.number(count, 0));
    const whole = item.coats > 1 ? $localize`${name}:step:, coat ${coat}:coat: of ${coats}:coats:` : name;
    const [portion, portions] = [item.portion, item.portions].map((count) => this.formats.number(count, 0));
    return item.portions > 1 ? $localize`${whole}:task:, portion ${portion}:portion: of ${portions}:portions:` : whole;
  }

  /** Short, to stand under a bar. */
  label(item: ProgrammeItem): string {
    const name = item.kind === 'carving' ? $localize`carving` : item.name.toLowerCase();
    const short = name.length > 24 ? `${name.slice(0, 22)}…` : name;
    return item.coats > 1 ? `${short} ${this.formats.number(item.coat, 0)}` : short;
  }

  /** "Thu 6 May, 16:10" in the workshop's zone. */
  moment(minutes: number, frame: ProgrammeFrame): string {
    const instant = instantOf(minutes, frame);
    return $localize`${this.formats.dayOf(instant, 'full')}:day:, ${this.formats.time(instant)}:time:`;
  }

  /** "Friday 4 June, 16:10". */
  longMoment(minutes: number, frame: ProgrammeFrame): string {
    const instant = instantOf(minutes, frame);
    return $localize`${this.formats.dayOf(instant, 'long')}:day:, ${this.formats.time(instant)}:time:`;
  }

  duration(minutes: number): string {
    return this.formats.figure('minutes', minutes < 2880 ? minutes : Math.round(minutes / 60) * 60);
  }

  /** Step and lot, when and how long, by whom, dry until, window until, slack, and why not earlier. */
  story(told: ToldTask): string[] {
    const { item, task } = told;
    return [
      `${this.name(item)} – ${item.lot}`,
      this.when(told),
      ...this.after(task, told.frame),
      ...(told.state === 'finished' ? [$localize`Finished.`] : []),
      ...(told.state === 'started' ? [$localize`In work.`] : []),
      ...(told.isPinned ? [$localize`Pinned to this time.`] : []),
      ...(told.state === 'planned' ? [this.slack(task)] : []),
      ...this.waits(task.waits),
    ];
  }

  /** Why something does not start earlier, a sentence each. */
  waits(reasons: readonly Reason[]): string[] {
    return reasons.map(({ code, values }) => {
      const day = values['day'];
      return this.words.say(code, typeof day === 'string' ? { ...values, day: this.formats.day(day, 'full') } : values);
    });
  }

  private when({ item, task, people, frame }: ToldTask): string {
    const from = this.moment(task.start_minutes, frame);
    const isOneDay = dayOfMinutes(task.start_minutes, frame) === dayOfMinutes(task.end_minutes, frame);
    const to = isOneDay ? this.formats.time(instantOf(task.end_minutes, frame)) : this.moment(task.end_minutes, frame);
    const who = task.personIds.map((id) => people.get(id) ?? item.grade).join(', ');
    const length = this.duration(item.handsOn_minutes);
    return who === ''
      ? $localize`${from}:from: to ${to}:to:.`
      : $localize`${from}:from: to ${to}:to:, ${length}:length: hands on, ${who}:who:.`;
  }

  private after({ dryUntil_minutes: dry, windowUntil_minutes: closes }: PlannedTask, frame: ProgrammeFrame): string[] {
    return [
      ...(dry === null ? [] : [$localize`Dry on ${this.moment(dry, frame)}:moment:.`]),
      ...(closes === null ? [] : [$localize`The window after it closes on ${this.moment(closes, frame)}:moment:.`]),
    ];
  }

  private slack({ isCritical, slack_minutes }: PlannedTask): string {
    return isCritical
      ? $localize`Whatever delays this delays the end.`
      : $localize`May start ${this.duration(slack_minutes)}:time: later without delaying the end.`;
  }
}
