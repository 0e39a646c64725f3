import * as z from 'zod';
import { paidFor, paidText, paidUnits, type MeasuredWork } from '#shared/estimates/price/measured-work';
import { measuringRules } from '#shared/measure/paid-quantity';
import { line } from '#shared/problems/entry-schema';

const typedLength = z.strictObject({ text: line(40), mm: z.number().min(0).max(1e6) });

/** What the quantity of a paid line is reckoned from. */
export const measuredWorkSchema = z.strictObject({
  rule: z.enum(measuringRules),
  length: typedLength.nullable(),
  girth: typedLength.nullable(),
  area: z.strictObject({ text: line(40), mm2: z.number().min(0).max(1e12) }).nullable(),
  sides: z.union([z.literal(1), z.literal(2)]),
  worth: z.number().min(0).max(100),
}) satisfies z.ZodType<MeasuredWork>;

interface PaidLine {
  readonly quantity: string;
  readonly unit: string;
  readonly measured?: MeasuredWork | undefined;
}

/** Whether a line that says what its quantity is reckoned from bears that quantity. */
export function isAsMeasured({ quantity, unit, measured }: PaidLine): boolean {
  if (!measured) return true;
  const [paid, known] = [paidFor(measured), paidUnits.find((one) => one === unit)];
  return paid !== null && known !== undefined && paidText(paid, known) === quantity;
}
