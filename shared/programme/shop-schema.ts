import * as z from 'zod';
import { daysBetween } from '#shared/calendar/add-days';
import { isDay } from '#shared/calendar/day';
import { climateSchema } from '#shared/drying/drying-card-schema';
import { cardItemId, complainAt, itemList } from '#shared/problems/card-entry-schema';
import { complain } from '#shared/problems/complaints-of';
import { day, identifier, line, optionalLine } from '#shared/problems/entry-schema';
import type { Shop } from '#shared/programme/shop';
import type { MomentSpan } from '#shared/programme/shop-calendar';

/** A day a calendar can be laid out to. */
export const calendarDay = day.refine(
  (text) => text >= '1971-01-01' && text <= '2199-12-31',
  complain('programme-day-outside'),
);

const longestStretch_days = 366;

const minuteOfDay = z.int().min(0).max(1440);

function spansFollow(spans: readonly MomentSpan[], context: z.core.$RefinementCtx): void {
  spans.forEach(({ start_minutes, end_minutes }, at) => {
    if (end_minutes <= start_minutes) complainAt(context, [at, 'end_minutes'], complain('shop-hours-end-before-start'));
    const before = spans[at - 1];
    if (before && start_minutes < before.end_minutes)
      complainAt(context, [at, 'start_minutes'], complain('shop-hours-overlap'));
  });
}

/** Hours of one day by the clock on the wall, in order and apart. */
export const dayHoursSchema = z
  .array(z.strictObject({ start_minutes: minuteOfDay, end_minutes: minuteOfDay }))
  .max(6)
  .superRefine(spansFollow);

/** Hours from Monday to Sunday. */
const weekSchema = z.array(dayHoursSchema).length(7);

function daysInOrder(
  { firstDay, lastDay }: { readonly firstDay: string; readonly lastDay: string },
  context: z.core.$RefinementCtx,
): void {
  if (lastDay < firstDay) complainAt(context, ['lastDay'], complain('shop-days-end-before-start'));
}

/** Each of its days is laid out by itself. What is no day is told of by its own entry. */
function isNotTooLong(
  { firstDay, lastDay }: { readonly firstDay: string; readonly lastDay: string },
  context: z.core.$RefinementCtx,
): void {
  if (!isDay(firstDay) || !isDay(lastDay)) return;
  if (daysBetween(firstDay, lastDay) >= longestStretch_days)
    complainAt(context, ['lastDay'], complain('shop-days-too-long'));
}

const shopDaysSchema = z
  .strictObject({ id: identifier, name: line(80), firstDay: calendarDay, lastDay: calendarDay, hours: dayHoursSchema })
  .superRefine(daysInOrder)
  .superRefine(isNotTooLong);

const absenceSchema = z
  .strictObject({ id: identifier, firstDay: calendarDay, lastDay: calendarDay, note: optionalLine(120) })
  .superRefine(daysInOrder);

const placeSchema = z.strictObject({
  id: identifier,
  name: line(80),
  kind: z.enum(['rack', 'bench']),
  capacity: z.int().min(1).max(1000),
});

const personSchema = z.strictObject({
  id: identifier,
  name: line(120),
  gradeIds: z.array(cardItemId).min(1).max(40),
  hours: weekSchema.nullable(),
  absences: itemList(absenceSchema, 200),
  membershipId: identifier.nullable(),
});

const noneOrYear = (climates: readonly unknown[]): boolean => climates.length === 0 || climates.length === 12;

/** What the workshop enters of itself to be planned with. */
export const shopContentSchema = z.strictObject({
  hours: weekSchema,
  productiveShare_percent: z.number().min(10).max(100),
  overtime_percent: z.number().min(0).max(300),
  days: itemList(shopDaysSchema, 400),
  climates: z.array(climateSchema).refine(noneOrYear, complain('shop-climates-none-or-year')),
  places: itemList(placeSchema, 60),
  people: itemList(personSchema, 100),
}) satisfies z.ZodType<Shop>;
export type ShopContent = z.infer<typeof shopContentSchema>;

/** The workshop's own data with its version (0: never entered, what stands is assumed), and the grades its people may have. */
export const shopSchema = z.strictObject({
  version: z.int().min(0),
  content: shopContentSchema,
  grades: z.array(z.strictObject({ id: z.string(), name: z.string() })),
  memberships: z.array(z.strictObject({ id: z.string(), name: z.string() })),
});
export type ShopAnswer = z.infer<typeof shopSchema>;
