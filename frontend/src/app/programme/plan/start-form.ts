import * as z from 'zod';
import { climateSchema } from '#shared/drying/drying-card-schema';
import { complainAt } from '#shared/problems/card-entry-schema';
import { complain } from '#shared/problems/complaints-of';
import { day } from '#shared/problems/entry-schema';
import type { ProgrammeInputs } from '#shared/programme/programme-inputs';

const { temperature_celsius, humidity_percent } = climateSchema.shape;

/** From when, or by when, an estimate is planned, and in which air. */
export const startFormSchema = z
  .strictObject({
    direction: z.enum(['forward', 'backward']),
    day,
    inHand_days: z.int().min(0).max(250),
    hasOwnAir: z.boolean(),
    temperature_celsius: temperature_celsius.nullable(),
    humidity_percent: humidity_percent.nullable(),
  })
  .superRefine((entered, context) => {
    if (!entered.hasOwnAir) return;
    for (const name of ['temperature_celsius', 'humidity_percent'] as const)
      if (entered[name] === null) complainAt(context, [name], complain('entry-missing'));
  });
export type StartEntries = z.output<typeof startFormSchema>;

export const startEntries = ({ direction, day: entered, inHand_days, climate }: ProgrammeInputs): StartEntries => ({
  ...{ direction, day: entered, inHand_days, hasOwnAir: climate !== null },
  temperature_celsius: climate?.temperature_celsius ?? null,
  humidity_percent: climate?.humidity_percent ?? null,
});

/** What of a programme's inputs they change. */
export function startInputsOf(entries: StartEntries): Partial<ProgrammeInputs> {
  const { direction, inHand_days, hasOwnAir } = entries;
  const [temperature, humidity] = [entries.temperature_celsius, entries.humidity_percent];
  const climate =
    hasOwnAir && temperature !== null && humidity !== null
      ? { temperature_celsius: temperature, humidity_percent: humidity }
      : null;
  return { direction, day: entries.day, inHand_days, climate };
}
