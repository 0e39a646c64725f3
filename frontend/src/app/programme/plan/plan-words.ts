import { Injectable, computed, inject } from '@angular/core';
import { compareDays } from '#shared/calendar/add-days';
import { dayOfMinutes } from '#shared/programme/programme-frame';
import type { Programme } from '#shared/programme/programme-plan';
import { Formats } from '../../core/formats/formats';
import { Words } from '../../core/formats/words';
import { idleReasons } from './idle-reasons';
import { ProgrammePlanning } from './programme-planning';
import { ProgrammeStore } from './programme-store';
import type { CostedRemedy } from './remedy-costs';
import { TaskWords } from './task-words';

const mostIdle = 5;

/** What is said of a programme as a whole. */
@Injectable()
export class PlanWords {
  private readonly formats = inject(Formats);
  private readonly words = inject(Words);
  private readonly tasks = inject(TaskWords);
  private readonly store = inject(ProgrammeStore);
  private readonly planning = inject(ProgrammePlanning);

  /** "Ready on Friday 4 June, 16:10". */
  readonly heading = computed(() => {
    const [answer, plan] = [this.store.answer(), this.store.plan()];
    const at = this.moment(plan?.finish_minutes);
    if (!at) return answer && answer.items.length === 0 ? $localize`Nothing to plan yet` : $localize`Not planned yet`;
    return $localize`Ready on ${at}:moment:`;
  });
  readonly hands = computed(() => {
    const answer = this.store.answer();
    if (!answer) return '';
    const carved = new Set(answer.items.filter(({ kind }) => kind === 'carving').map(({ lotId }) => lotId));
    const lots = new Set(answer.items.map(({ lotId }) => lotId)).size - carved.size;
    const people = answer.request.people.length;
    return [
      lots === 1 ? $localize`one lot` : $localize`${this.count(lots)}:lots: lots`,
      ...(carved.size === 0 ? [] : [this.carved(carved.size)]),
      people === 1 ? $localize`one person` : $localize`${this.count(people)}:people: people`,
    ].join(', ');
  });
  readonly chips = computed<readonly string[]>(() => [...this.startChips(), ...this.planChips()]);
  readonly idle = computed(() => {
    const [answer, plan] = [this.store.answer(), this.store.plan()];
    if (!answer || !plan) return [];
    return idleReasons(plan, answer.items, mostIdle).map(({ item, waits }) => ({
      name: `${item.lot}, ${this.tasks.name(item)}:`,
      text: this.tasks.waits(waits).join(' '),
    }));
  });
  readonly progress = computed(() => {
    const at = this.moment(this.planning.bestFinish_minutes());
    if (at) return $localize`Looking for a better plan; ready on ${at}:moment: so far …`;
    return this.planning.isOnServer() ? $localize`The server is planning …` : $localize`Planning …`;
  });
  readonly proposed = computed(() => {
    const [proposal, answer] = [this.store.proposal(), this.store.answer()];
    const finish = proposal?.plan.finish_minutes;
    if (!proposal || finish === null || finish === undefined) return '';
    const at = this.moment(finish) ?? '';
    const before = answer?.plan?.finish_minutes;
    const later = before === null || before === undefined ? 0 : finish - before;
    const time = this.tasks.duration(Math.abs(later));
    if (later > 0) return $localize`A new plan, not kept yet: ready on ${at}:moment:, ${time}:time: later than before.`;
    if (later < 0)
      return $localize`A new plan, not kept yet: ready on ${at}:moment:, ${time}:time: sooner than before.`;
    if (before && answer?.isCurrent && proposal.inputs === null)
      return $localize`No better plan was found: this one, not kept yet, is ready on ${at}:moment: too.`;
    return $localize`A new plan, not kept yet: ready on ${at}:moment:.`;
  });
  /** What was tried: where it helps when it would be ready and, for those who see cost, what it costs more. */
  readonly helps = computed(() =>
    (this.planning.remedies() ?? []).map((remedy) => {
      const { code, values, plan } = remedy;
      const at = this.moment(plan.finish_minutes);
      const [way, ready] = [this.words.say(code, this.named(values)), $localize`Ready on ${at ?? ''}:moment:.`];
      return at ? [way, ready, ...this.costOf(remedy)].join(' ') : [way, $localize`This does not help.`].join(' ');
    }),
  );

  private costOf({ code, cost_minor, overtime_percent }: CostedRemedy): string[] {
    if (cost_minor === null) return [];
    if (cost_minor === 0) return [$localize`It costs the workshop no more.`];
    const amount = this.formats.money(Math.abs(cost_minor));
    if (cost_minor < 0) return [$localize`It costs the workshop ${amount}:amount: less.`];
    if (code !== 'programme-remedy-longer-day') return [$localize`It costs the workshop ${amount}:amount: more.`];
    const premium = this.formats.figure('percent', overtime_percent);
    return [$localize`It costs the workshop ${amount}:amount: more, with ${premium}:premium: on top for overtime.`];
  }

  private carved(members: number): string {
    return members === 1 ? $localize`one carved member` : $localize`${this.count(members)}:members: carved members`;
  }

  private startChips(): string[] {
    const answer = this.store.answer();
    if (!answer) return [];
    const { direction, day, climate, inHand_days } = answer.inputs;
    const when = this.formats.day(day, 'full');
    const air = climate && [
      this.formats.figure('celsius', climate.temperature_celsius),
      this.formats.figure('percent', climate.humidity_percent),
    ];
    return [
      direction === 'forward' ? $localize`from ${when}:day:` : $localize`wanted by ${when}:day:`,
      ...(air ? [$localize`workshop at ${air[0]}:temperature:, ${air[1]}:humidity:`] : []),
      ...(inHand_days > 0 ? [$localize`${this.formats.figure('days', inHand_days)}:days: in hand`] : []),
    ];
  }

  private planChips(): string[] {
    const [answer, plan, frame] = [this.store.answer(), this.store.plan(), this.store.frame()];
    if (!answer || !frame || !plan || plan.finish_minutes === null) return [];
    const isProposed = this.store.proposal() !== undefined;
    const offered = isProposed || !answer.isCurrent ? undefined : answer.dates?.offeredOn;
    const starts = dayOfMinutes(plan.start_minutes, frame);
    return [
      ...(compareDays(starts, answer.inputs.day) === 0
        ? []
        : [$localize`starts ${this.formats.day(starts, 'full')}:day:`]),
      ...(offered ? [$localize`offer ${this.formats.day(offered, 'full')}:day:`] : []),
      // What was proven of a plan says nothing once what it was made from has changed.
      ...(isProposed || answer.isCurrent ? [this.proof(plan)] : []),
    ];
  }

  private proof({ status, gap }: Programme): string {
    if (status === 'optimal' || gap === 0) return $localize`no plan is sooner`;
    return $localize`at most ${this.formats.percent((gap ?? 0) * 100, 0)}:percent: from the soonest possible`;
  }

  /** Grades by their names. */
  private named(values: Readonly<Record<string, string | number>>) {
    const grade = this.store.answer()?.items.find(({ gradeId }) => gradeId === values['grade'])?.grade;
    return grade ? { ...values, grade } : values;
  }

  private moment(minutes: number | null | undefined): string | undefined {
    const frame = this.store.frame();
    return minutes === null || minutes === undefined || !frame ? undefined : this.tasks.longMoment(minutes, frame);
  }

  private count(figure: number): string {
    return this.formats.number(figure, 0);
  }
}
