import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { dayLength_minutes, dayOf } from '#shared/drying/day-length-minutes';
import type { SequenceStep } from '#shared/drying/sequence-step';
import type { Finding } from '#shared/words/finding';
import type { Reason } from '#shared/words/reason';
import { Formats } from '../core/formats/formats';
import { Words } from '../core/formats/words';
import type { Explained } from '../ui/figure/explained';
import { Figure } from '../ui/figure/figure';
import type { WorkedLot } from './worked-lot';

const isSetUp = ({ code }: Reason): boolean => code === 'buildup-hours-set-up';

/** The steps of one lot in words and figures: what the ribbon shows, for whoever reads it, hears it or prints it. */
@Component({
  selector: 'app-lot-steps',
  imports: [Figure],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './lot-steps.html',
  styleUrl: './lot-steps.scss',
})
export class LotSteps {
  private readonly formats = inject(Formats);
  private readonly words = inject(Words);

  readonly lot = input.required<WorkedLot>();
  /** What is to be known about the lot; waits for people stand beside the step that waits. */
  readonly findings = input<readonly Finding[]>([]);

  /** A step that takes no time, neither to do nor to dry, is none here. */
  private readonly told = computed(() =>
    this.lot().steps.filter(({ handsOn_minutes, opens_minutes }) => handsOn_minutes > 0 || opens_minutes > 0),
  );
  protected readonly lines = computed(() =>
    this.told().map((step) => ({
      id: step.stepId,
      name: step.name,
      coats: this.formats.number(step.coats, 0),
      handsOn: this.handsOn(step),
      between: step.coats > 1 ? this.minutes(step.betweenCoats_minutes) : '',
      dries: step.opens_minutes > 0 ? this.minutes(step.opens_minutes) : $localize`at once`,
      explained: this.explained(step),
      window: this.window(step),
      when: this.when(step),
      notes: this.notes(step),
    })),
  );

  private minutes(minutes: number): string {
    return this.formats.figure('minutes', minutes);
  }

  /** Hands-on time, which opens to the days of set-up in it. */
  private handsOn({ stepId, name, handsOn_minutes, reasons }: SequenceStep) {
    const text = this.minutes(handsOn_minutes);
    const heading = $localize`${name}:step: takes ${text}:time:`;
    const setUp = reasons.filter(isSetUp);
    const explained = { id: `hands on ${this.lot().lotId} ${stepId}`, heading, reasons: setUp };
    return { text, explained: setUp.length > 0 ? explained : undefined };
  }

  private explained(step: SequenceStep): Explained {
    const heading = $localize`${step.name}:step: dries in ${this.minutes(step.opens_minutes)}:time:`;
    return {
      id: `dry ${this.lot().lotId} ${step.stepId}`,
      heading,
      reasons: step.reasons.filter((reason) => !isSetUp(reason)),
    };
  }

  private window({ opens_minutes, closes_minutes, endsInWindow }: SequenceStep): string {
    const opens = this.minutes(opens_minutes);
    if (closes_minutes === null) return opens_minutes > 0 ? $localize`from ${opens}:opens:, stands open` : '';
    const closes = this.minutes(closes_minutes);
    return endsInWindow
      ? $localize`${opens}:opens: to ${closes}:closes:, done by then`
      : $localize`${opens}:opens: to ${closes}:closes:`;
  }

  /** “day 3 to day 5”. */
  private when({ stepId }: SequenceStep): string {
    const tasks = this.lot().tasks.filter((task) => task.stepId === stepId);
    if (tasks.length === 0) return '';
    const from = Math.min(...tasks.map(({ start_minutes }) => start_minutes));
    const to = Math.max(...tasks.map(({ end_minutes }) => end_minutes));
    const [first, last] = [from, to].map((at_minutes) => this.formats.number(dayOf(at_minutes) + 1, 0));
    return first === last ? $localize`day ${first}:day:` : $localize`day ${first}:day: to ${last}:lastDay:`;
  }

  private notes(step: SequenceStep): string[] {
    const holds = this.findings()
      .filter(({ code, values }) => code.startsWith('drying-hold-') && values['step'] === step.name)
      .map(({ code, values }) => this.words.say(code, values));
    const missed = step.missed ? [this.words.say(`drying-missed-${step.missed}`)] : [];
    return [...holds, ...this.limits(step), ...missed];
  }

  private limits({ lags, latestCoat_minutes, wholeWithin_minutes, coats }: SequenceStep): string[] {
    const named = (id: string) => this.lot().steps.find(({ stepId }) => stepId === id)?.name ?? id;
    return [
      latestCoat_minutes !== null && coats > 1
        ? $localize`The next coat goes on within ${this.minutes(latestCoat_minutes)}:time:.`
        : '',
      wholeWithin_minutes === null ? '' : $localize`All coats within ${this.minutes(wholeWithin_minutes)}:time:.`,
      ...lags.flatMap(({ toStepId, least_minutes, finishedWithin_minutes }) => [
        least_minutes !== null && least_minutes >= dayLength_minutes
          ? $localize`${named(toStepId)}:step: not before ${this.minutes(least_minutes)}:time:.`
          : '',
        finishedWithin_minutes === null
          ? ''
          : $localize`${named(toStepId)}:step: is finished within ${this.minutes(finishedWithin_minutes)}:time: of its start.`,
      ]),
    ].filter(Boolean);
  }
}
