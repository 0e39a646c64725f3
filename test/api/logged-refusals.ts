import type { Response } from 'supertest';
import type { Api, TestPerson } from './start-api';

/** Whom the log names beside a refusal: a person in their workshop; nobody for a stranger. */
export interface Refused {
  readonly workshopId?: string;
  readonly accountId?: string;
}

/** Somebody of a workshop, as the log names them. */
export const whoIs = ({ actor }: TestPerson): Refused => ({
  workshopId: actor.workshopId,
  accountId: actor.accountId,
});

/** Who was refused with which status, as the log has it under the number of one request, each event once (ASVS 16.2.1, 16.3.2). */
export function refusalsOf(api: Api, { headers }: Response): object[] {
  const number = String(headers['x-request-id']);
  return api.logLines
    .filter((line) => line.includes(number))
    .map((line) => JSON.parse(line) as Record<string, unknown>)
    .filter(({ msg }) => msg === 'refused')
    .map(({ workshopId, accountId, status, time }) => {
      if (!/^\d{4}-\d\d-\d\dT[\d:.]+Z$/.test(String(time))) throw new Error(`not in UTC: ${String(time)}`);
      return { ...(workshopId ? { workshopId } : {}), ...(accountId ? { accountId } : {}), status };
    });
}
