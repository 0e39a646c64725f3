import { minutesOf, type ProgrammeFrame } from '#shared/programme/programme-frame';
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

/** Draws the jobs of the board as lines of a ribbon. */
export class BoardLots {
  constructor(
    private readonly formats: Formats,
    private readonly frame: ProgrammeFrame,
    private readonly people: ReadonlyMap<string, string>,
  ) {}

  of(jobs: readonly BoardJob[]): RibbonLot[] {
    return jobs.map((job) => ({
      id: job.estimateId,
      name: job.title,
      minor: this.standing(job),
      link: ['/jobs', job.jobId],
      tasks: job.tasks
        .map((task) => this.task(job, task))
        .sort((one, other) => one.start_minutes - other.start_minutes),
    }));
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
