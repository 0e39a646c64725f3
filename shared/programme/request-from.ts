import type { ProgrammeRequest } from '#shared/programme/programme-request';

/** The same request planned from a later moment on, in minutes: from an earlier one nothing changes. */
export const requestFrom = (request: ProgrammeRequest, from_minutes: number): ProgrammeRequest =>
  from_minutes <= request.start_minutes ? request : { ...request, start_minutes: from_minutes };
