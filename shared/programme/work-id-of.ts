import type { ProgrammeItem } from '#shared/programme/programme-item';
import { stepWorkId } from '#shared/programme/task-id';

/** The work a task belongs to, of which is entered how many hands it takes: its step on its lot, or the carving of a member by one grade. */
export const workIdOf = ({ taskId, lotId, stepId }: Pick<ProgrammeItem, 'taskId' | 'lotId' | 'stepId'>): string =>
  stepId === null ? taskId : stepWorkId(lotId, stepId);
