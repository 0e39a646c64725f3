import { gunzipSync, gzipSync } from 'node:zlib';
import type { Day } from '#shared/calendar/day';
import type { ProgrammeApproval } from '#shared/programme/lot-programme';
import type { ProgrammeDates } from '#shared/programme/programme-dates';
import { minutesBetween, programmeFrame, type ProgrammeFrame } from '#shared/programme/programme-frame';
import type { ProgrammeItem } from '#shared/programme/programme-item';
import type { Programme } from '#shared/programme/programme-plan';
import type { PlaceHold, ProgrammeRequest } from '#shared/programme/programme-request';
import { shiftedPlan } from '#shared/programme/shifted-plan';

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
  /** How often the programme had been kept with another plan before, and when this one was. */
  readonly revision: number;
  readonly keptAt: string | null;
}

/** As JSON, gzipped. */
export const packed = (content: object): Buffer => gzipSync(JSON.stringify(content));

/** Reads what `packed` wrote. */
const unpacked = <Content>(bytes: Buffer): Content => JSON.parse(gunzipSync(bytes).toString('utf8')) as Content;

/** A plan as it was written down; earlier ones did not say what they were planned from: the start of their first day. */
type WrittenPlan = Omit<Programme, 'from_minutes'> & Partial<Pick<Programme, 'from_minutes'>>;
/** Earlier ones did not say how often they had been kept anew either. */
type WrittenKeptPlan = Omit<KeptPlan, 'plan' | 'revision' | 'keptAt'> &
  Partial<Pick<KeptPlan, 'revision' | 'keptAt'>> & { readonly plan: WrittenPlan };

const wholePlan = (plan: WrittenPlan): Programme => ({ ...plan, from_minutes: plan.from_minutes ?? 0 });

export const unpackedProgramme = (bytes: Buffer): Programme => wholePlan(unpacked<WrittenPlan>(bytes));

/** A kept plan in the minutes of another frame. */
export const planIn = ({ firstDay, timeZone, plan }: KeptPlan, frame: ProgrammeFrame): Programme =>
  shiftedPlan(plan, minutesBetween(programmeFrame(firstDay, timeZone), frame));

export function unpackedPlan(bytes: Buffer): KeptPlan {
  const kept = unpacked<WrittenKeptPlan>(bytes);
  return { ...kept, plan: wholePlan(kept.plan), revision: kept.revision ?? 0, keptAt: kept.keptAt ?? null };
}
