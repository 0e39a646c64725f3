import type { ProgrammeRequest, ProgrammeTask } from '#shared/programme/programme-request';

/** Whether a task stands where it is pinned: not once it has happened, nor where its moment was over before anything is planned. */
export const isHeldByPin = (
  { pinned_minutes, happened }: ProgrammeTask,
  { start_minutes }: ProgrammeRequest,
): boolean => pinned_minutes !== null && !happened && pinned_minutes >= start_minutes;
