import { gunzipSync, gzipSync } from 'node:zlib';
import type { Day } from '#shared/calendar/day';
import type { ProgrammeApproval } from '#shared/programme/lot-programme';
import type { ProgrammeDates } from '#shared/programme/programme-dates';
import type { ProgrammeItem } from '#shared/programme/programme-item';
import type { Programme } from '#shared/programme/programme-plan';
import type { PlaceHold, ProgrammeRequest } from '#shared/programme/programme-request';

/** A plan that was kept, with what it was made from, so that the bench and the board can be told of it without working the estimate again. */
export interface KeptPlan {
  readonly firstDay: Day;
  readonly timeZone: string;
  readonly plan: Programme;
  readonly items: readonly ProgrammeItem[];
  readonly approvals: readonly ProgrammeApproval[];
  readonly lags: ProgrammeRequest['lags'];
  readonly paces: ProgrammeRequest['paces'];
  readonly placeHolds: readonly PlaceHold[];
  readonly dates: ProgrammeDates | null;
}

/** As JSON, gzipped. */
export const packed = (content: object): Buffer => gzipSync(JSON.stringify(content));

/** Reads what `packed` wrote. */
export const unpacked = <Content>(bytes: Buffer): Content => JSON.parse(gunzipSync(bytes).toString('utf8')) as Content;

export const unpackedPlan = (bytes: Buffer): KeptPlan => unpacked<KeptPlan>(bytes);
