import { addDays } from '#shared/calendar/add-days';
import { minutesOf, minutesOfDay, type ProgrammeFrame } from '#shared/programme/programme-frame';
import type { BoardAnswer, BoardJob } from '#shared/programme/board-schema';
import type { MomentSpan } from '#shared/programme/shop-calendar';
import type { Formats } from '../../core/formats/formats';
import type { RibbonLot, RibbonTask } from '../ribbon/ribbon-lot';

type BoardTask = BoardJob['tasks'][number];

const spanOf = (at: { readonly startsAt: string; readonly endsAt: string }, frame: ProgrammeFrame): MomentSpan => ({
  start_minutes: minutesOf(at.startsAt, frame),
  end_minutes: minutesOf(at.endsAt, frame),
});

/** When the workshop is open, in minutes of a frame. */
export const openOf = ({ open }: BoardAnswer, frame: ProgrammeFrame): MomentSpan[] =>
  open.map((span) => spanOf(span, frame));

/** The minute at which the days of a board end; they begin at 0. */
export const endOf = ({ lastDay }: BoardAnswer, frame: ProgrammeFrame): number =>
  minutesOfDay(addDays(lastDay, 1), frame);

/** Draws the jobs of the board as lines of a ribbon, with the work that falls into its days. */
export class BoardLots {
  constructor(
    private readonly formats: Formats,
    private readonly frame: ProgrammeFrame,
    private readonly people: ReadonlyMap<string, string>,
  ) {}

  of(board: BoardAnswer): RibbonLot[] {
    const end_minutes = endOf(board, this.frame);
    return board.jobs.map((job) => {
      const tasks = job.tasks
        .map((task) => this.task(job, task))
        .filter((task) => task.start_minutes < end_minutes && (task.dryUntil_minutes ?? task.end_minutes) > 0)
        .sort((one, other) => one.start_minutes - other.start_minutes);
      const minor = tasks.length > 0 ? this.standing(job) : this.elsewhere(job);
      return { id: job.estimateId, name: job.title, minor, link: ['/jobs', job.jobId], tasks };
    });
  }

  private elsewhere({ startsAt, finishesAt }: BoardJob): string {
    const [from, to] = [startsAt, finishesAt].map((at) => this.formats.dayOf(at, 'short'));
    return $localize`${from}:from: to ${to}:to:`;
  }

  private standing({ standing, heldUntil, clientName }: BoardJob): string {
    if (standing === 'accepted' || !heldUntil) return clientName;
    return $localize`held until ${this.formats.day(heldUntil, 'short')}:day:`;
  }

  private task(job: BoardJob, task: BoardTask): RibbonTask {
    return {
      ...{ id: `${job.estimateId} ${task.taskId}`, name: `${task.name}, ${task.lot}`, label: task.lot },
      ...spanOf(task, this.frame),
      spans: task.spans.map((span) => spanOf(span, this.frame)),
      dryUntil_minutes: task.dryAt === null ? null : minutesOf(task.dryAt, this.frame),
      window: null,
      look: job.standing === 'held' ? 'held' : task.state === 'finished' ? 'done' : 'planned',
      ...{ isPinned: false, isCritical: false, isMovable: false },
      story: this.story(job, task),
    };
  }

  private story({ number, title }: BoardJob, task: BoardTask): string[] {
    const who = task.personIds
      .map((id) => this.people.get(id))
      .filter(Boolean)
      .join(', ');
    const [from, to] = [task.startsAt, task.endsAt].map((at) => this.moment(at));
    return [
      `${task.name} – ${task.lot}`,
      `${number} ${title}.`,
      who === '' ? $localize`${from}:from: to ${to}:to:.` : $localize`${from}:from: to ${to}:to:, ${who}:who:.`,
      ...(task.dryAt ? [$localize`Dry on ${this.moment(task.dryAt)}:moment:.`] : []),
    ];
  }

  private moment(at: string): string {
    return $localize`${this.formats.dayOf(at, 'full')}:day:, ${this.formats.time(at)}:time:`;
  }
}
