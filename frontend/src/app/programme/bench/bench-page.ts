import {
  ChangeDetectionStrategy,
  Component,
  DestroyRef,
  computed,
  inject,
  linkedSignal,
  resource,
  signal,
} from '@angular/core';
import { MatButton, MatIconButton } from '@angular/material/button';
import { addDays } from '#shared/calendar/add-days';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import type { BenchTask } from '#shared/programme/bench-task';
import type { BenchDay, MarkKind } from '#shared/programme/bench-day-schema';
import { Formats } from '../../core/formats/formats';
import { NOW } from '../../core/now';
import { Notices } from '../../core/problems/notices';
import { ProblemError } from '../../core/problems/problem-error';
import { Session } from '../../core/session/session';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { Icon } from '../../ui/icon/icon';
import { EmptyState } from '../../ui/page/empty-state';
import { Skeleton } from '../../ui/page/skeleton';
import { CalendarFeeds } from '../calendars/calendar-feeds';
import { BenchClient } from './bench-client';
import { BenchWords } from './bench-words';
import { windowBar } from './window-bar';

const minute_ms = 60_000;

const nothingToDo = {
  heading: $localize`Nothing more to do this day`,
  text: $localize`What is planned for you stands here, in order, with the windows that close.`,
};
const nobodyKnown = {
  heading: $localize`Nobody at the bench has your name yet`,
  text: $localize`Under Programme, Workshop the owner says which person of the workshop you are; then your work stands here.`,
};
const nobodyChosen = {
  heading: $localize`Whose day is it to be?`,
  text: $localize`Choose somebody above. If you work at the bench yourself, the page Workshop under Programme says who you are there; then your own day opens here.`,
};

/** One thing at a time: what is now or next with its window, then the list of the day. Nothing of cost. */
@Component({
  selector: 'app-bench-page',
  imports: [CalendarFeeds, EmptyState, Entry, Field, Icon, MatButton, MatIconButton, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './bench-page.html',
  styleUrl: './bench-page.scss',
})
export class BenchPage {
  private readonly client = inject(BenchClient);
  protected readonly formats = inject(Formats);
  private readonly notices = inject(Notices);
  private readonly session = inject(Session);
  private readonly clock = inject(NOW);
  protected readonly words = inject(BenchWords);

  private readonly now = signal(this.clock());
  /** Another day than today. */
  protected readonly asked = signal<string | undefined>(undefined);
  protected readonly personId = signal<string | undefined>(undefined);
  protected readonly isBusy = signal(false);
  protected readonly isOnlyBench = !this.session.may('owner', 'estimator', 'office');
  protected readonly reading = resource({
    params: () => ({ day: this.asked(), personId: this.personId() }),
    loader: ({ params, abortSignal }) => this.client.day(params, abortSignal),
  });
  /** The day that was read last stays while another is on its way. */
  protected readonly shown = linkedSignal<BenchDay | undefined, BenchDay | undefined>({
    source: () => (this.reading.hasValue() ? this.reading.value() : undefined),
    computation: (read, before) => read ?? before?.value,
  });
  private readonly today = computed(() => dayOfInstant(this.now().getTime(), this.formats.timeZone()));
  protected readonly day = computed(() => this.asked() ?? this.shown()?.day ?? this.today());
  protected readonly isToday = computed(() => this.day() === this.today());
  protected readonly dayName = computed(() => this.formats.day(this.day(), 'long'));
  protected readonly people = computed(() => this.shown()?.people ?? []);
  protected readonly heading = computed(() => {
    const name = this.shown()?.person?.name;
    const isOwn = this.isOnlyBench || this.people().length === 0;
    return isOwn || !name ? $localize`Your day` : $localize`The day of ${name}:name:`;
  });
  /** What is in work, else the first that can be begun, else the first that is still waited for. */
  protected readonly current = computed<BenchTask | undefined>(() => {
    const tasks = this.shown()?.tasks ?? [];
    const inState = (state: BenchTask['state']) => tasks.find((task) => task.state === state);
    return inState('started') ?? inState('ready') ?? tasks.find(({ state }) => state !== 'finished');
  });
  protected readonly rest = computed(() => (this.shown()?.tasks ?? []).filter((task) => task !== this.current()));
  protected readonly bar = computed(() => {
    const task = this.current();
    return task ? windowBar(task, this.now().getTime()) : null;
  });
  protected readonly nowLine = computed(() => {
    const task = this.current();
    if (!task) return '';
    const length = this.words.length(task);
    const from = this.words.moment(task.startsAt);
    if (task.state === 'started') return $localize`In work since ${from}:time:, ${length}:length: planned`;
    if (task.state === 'ready') return $localize`Planned for ${from}:time:, ${length}:length:`;
    return this.words.state(task);
  });
  /** Always in view beside the button. */
  protected readonly window = computed(() => {
    const closes = this.current()?.windowClosesAt;
    return closes ? this.words.until(closes) : '';
  });
  protected readonly windowText = computed(() => {
    const [task, bar] = [this.current(), this.bar()];
    if (!task?.windowClosesAt || !bar) return '';
    const closes = this.words.moment(task.windowClosesAt);
    if (bar.state === 'closed')
      return $localize`The window closed at ${closes}:time:. Have somebody look at it before you go on.`;
    if (bar.state === 'ahead' && task.readyAt)
      return $localize`Window from ${this.words.moment(task.readyAt)}:time: until ${closes}:time:`;
    return $localize`Window open until ${closes}:time:`;
  });
  protected readonly windowLabel = computed(() => {
    const over = this.formats.percent(this.bar()?.over_percent ?? 0, 0);
    return $localize`${over}:percent: of the window is over`;
  });
  protected readonly empty = computed(() => {
    if (this.shown()?.person) return nothingToDo;
    return this.people().length > 1 ? nobodyChosen : nobodyKnown;
  });

  constructor() {
    const turning = setInterval(() => this.now.set(this.clock()), minute_ms);
    inject(DestroyRef).onDestroy(() => clearInterval(turning));
  }

  protected step(days: number): void {
    this.open(addDays(this.day(), days));
  }

  protected open(day: string): void {
    this.asked.set(day === this.today() ? undefined : day);
  }

  /** What may be said of work whose planned time came and that nobody marked in time; nothing where that is not so. */
  protected asPlanned({ state, startsAt, endsAt }: BenchTask): string {
    const now = this.now().getTime();
    if (state !== 'ready' || Date.parse(startsAt) >= now) return '';
    return Date.parse(endsAt) <= now ? $localize`Done as planned` : $localize`Begun as planned`;
  }

  protected mark(task: BenchTask, mark: MarkKind): Promise<void> {
    return this.marked(() => this.client.mark(task, mark));
  }

  protected markAsPlanned(task: BenchTask): Promise<void> {
    return this.marked(() => this.client.asPlanned(task));
  }

  private async marked(say: () => Promise<unknown>): Promise<void> {
    if (this.isBusy()) return;
    this.isBusy.set(true);
    try {
      await say();
      this.reading.reload();
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      this.notices.complain([error.message, ...error.problem.errors.map(({ message }) => message)].join(' '));
    } finally {
      this.isBusy.set(false);
    }
  }
}
