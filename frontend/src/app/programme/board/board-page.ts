import { ChangeDetectionStrategy, Component, computed, inject, resource, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { addDays } from '#shared/calendar/add-days';
import { minutesOf, programmeFrame } from '#shared/programme/programme-frame';
import type { BoardAnswer } from '#shared/programme/board-schema';
import { Formats } from '../../core/formats/formats';
import { NOW } from '../../core/now';
import { EmptyState } from '../../ui/page/empty-state';
import { PageHeader } from '../../ui/page/page-header';
import { Skeleton } from '../../ui/page/skeleton';
import { ProgrammeParts } from '../programme-parts';
import { DatedRibbon } from '../ribbon/dated-ribbon';
import { RibbonTable } from '../ribbon/ribbon-table';
import { BoardClient } from './board-client';
import { BoardLots, endOf, openOf } from './board-lots';
import { LoadTable } from './load-table';
import { UnplannedList } from './unplanned-list';

const weeks = 26;
/** So far one goes at once: half of what is shown stays. */
const step_days = 91;

/** All accepted jobs and held offers on one calendar, the load by grade and week, and whatever is promised twice. */
@Component({
  selector: 'app-board-page',
  imports: [
    DatedRibbon,
    EmptyState,
    LoadTable,
    MatButton,
    PageHeader,
    ProgrammeParts,
    RibbonTable,
    RouterLink,
    Skeleton,
    UnplannedList,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './board-page.html',
  styleUrl: './board-page.scss',
})
export class BoardPage {
  private readonly client = inject(BoardClient);
  private readonly formats = inject(Formats);
  private readonly now = inject(NOW);

  protected readonly jobName = $localize`Job`;
  protected readonly chosen = signal<string | undefined>(undefined);
  /** The first day asked for; this week's Monday without one. */
  protected readonly from = signal<string | undefined>(undefined);
  protected readonly reading = resource({
    params: () => {
      const from = this.from();
      return from === undefined ? { weeks } : { from, weeks };
    },
    loader: ({ params, abortSignal }) => this.client.read(params, abortSignal),
  });
  protected readonly board = computed<BoardAnswer | undefined>(() =>
    this.reading.hasValue() ? this.reading.value() : undefined,
  );
  protected readonly about = computed(() => {
    const board = this.board();
    if (!board || board.jobs.length + board.unplanned.length === 0) return '';
    const count = (standing: string) =>
      this.formats.number(board.jobs.filter((job) => job.standing === standing).length, 0);
    const planned = $localize`${count('accepted')}:accepted: accepted, ${count('held')}:held: held`;
    if (board.unplanned.length === 0) return planned;
    return $localize`${planned}:planned:, ${this.formats.number(board.unplanned.length, 0)}:unplanned: not planned yet`;
  });
  protected readonly days = computed(() => {
    const board = this.board();
    if (!board) return '';
    const [first, last] = [board.firstDay, board.lastDay].map((day) => this.formats.day(day));
    return $localize`${first}:first: to ${last}:last:`;
  });
  protected readonly frame = computed(() => {
    const board = this.board();
    return board && programmeFrame(board.firstDay, board.timeZone);
  });
  protected readonly now_minutes = computed(() => {
    const [board, frame] = [this.board(), this.frame()];
    if (!board || !frame) return undefined;
    const now = minutesOf(this.now().toISOString(), frame);
    return now >= 0 && now < endOf(board, frame) ? now : undefined;
  });
  protected readonly lots = computed(() => {
    const [board, frame] = [this.board(), this.frame()];
    if (!board || !frame) return [];
    const people = new Map(board.people.map(({ id, name }) => [id, name]));
    return new BoardLots(this.formats, frame, people).of(board);
  });
  protected readonly open = computed(() => {
    const [board, frame] = [this.board(), this.frame()];
    return board && frame ? openOf(board, frame) : [];
  });
  protected readonly chosenTask = computed(() =>
    this.lots()
      .flatMap(({ tasks }) => tasks)
      .find(({ id }) => id === this.chosen()),
  );
  protected readonly clashes = computed(() => (this.board()?.clashes ?? []).map((clash) => this.clashText(clash)));

  protected step(by: -1 | 1): void {
    const board = this.board();
    if (board) this.from.set(addDays(board.firstDay, by * step_days));
  }

  private clashText({ name, startsAt, endsAt, estimateIds }: BoardAnswer['clashes'][number]): string {
    const jobs = (this.board()?.jobs ?? []).filter((job) => estimateIds.includes(job.estimateId));
    const titles = jobs.map(({ title }) => title).join(', ');
    const [day, from, to] = [
      this.formats.dayOf(startsAt, 'full'),
      this.formats.time(startsAt),
      this.formats.time(endsAt),
    ];
    return $localize`${name}:name: is promised twice on ${day}:day:, ${from}:from: to ${to}:to:: ${titles}:jobs:.`;
  }
}
