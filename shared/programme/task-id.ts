/** The id of a step on a lot, all its coats and portions together. */
export const stepWorkId = (lotId: string, stepId: string): string => `${lotId}/${stepId}`;

/** The id of a coat of a step on a lot, in a portion of it: the same for the same work, however often it is planned. */
export const coatTaskId = (lotId: string, at: { stepId: string; portion: number; coat: number }): string =>
  `${stepWorkId(lotId, at.stepId)}/${at.portion}.${at.coat}`;

/** The id of the carving of a member by one grade. */
export const carvingTaskId = (memberId: string, gradeId: string): string => `${memberId}/carving/${gradeId}`;

/** The id of the moment at which all carving of a member has ended. */
export const carvedTaskId = (memberId: string): string => `${memberId}/carved`;
