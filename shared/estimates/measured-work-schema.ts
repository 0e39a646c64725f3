import * as z from 'zod';
import { paidFor, paidText, paidUnits, type MeasuredWork } from '#shared/estimates/price/measured-work';
import { measuringRules } from '#shared/measure/paid-quantity';
import { complain } from '#shared/problems/complaints-of';
import { asTyped, line } from '#shared/problems/entry-schema';

const length = z.number().min(0).max(1e6).nullable();

const workMeasureSchema = z.strictObject({
  count: z.int().min(1).max(10_000),
  length_mm: length,
  girth_mm: length,
  area_mm2: z.number().min(0).max(1e12).nullable(),
  sides: z.union([z.literal(1), z.literal(2)]),
  worth: z.number().min(0).max(100),
});

const mostMeasures = 40;

/** What the quantity of a paid line is reckoned from. */
export const measuredWorkSchema = z.strictObject({
  rule: z.enum(measuringRules),
  measures: z.array(workMeasureSchema).min(1).max(mostMeasures),
  typed: z
    .record(asTyped(40), line(60))
    .refine((typed) => Object.keys(typed).length <= 3 * mostMeasures, complain('entry-too-many', { maximum: 120 })),
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
