import type { JobOrder } from '#shared/jobs/job-schema';
import * as z from 'zod';
import type { ListOrder } from '../platform/database/listed-rows';
import type { JobRow } from './job-model';

/** The instants a column of the database can hold. */
const instant = z.iso
  .datetime()
  .transform((text) => new Date(text))
  .refine((at) => at.getUTCFullYear() >= 1000 && at.getUTCFullYear() <= 9999);

/** The orders of the list of jobs, each along an index of its table. */
export const jobListOrders: Readonly<Record<JobOrder, ListOrder<JobRow>>> = {
  changed: { columns: ['changedAt', 'id'], direction: 'DESC', cursor: z.tuple([instant, z.uuid()]) },
  number: { columns: ['year', 'ordinal'], direction: 'DESC', cursor: z.tuple([z.int(), z.int()]) },
  title: { columns: ['title', 'id'], direction: 'ASC', cursor: z.tuple([z.string(), z.uuid()]) },
};
