import type { JobOrder } from '#shared/jobs/job-schema';
import type { ListOrder } from '../platform/database/listed-rows';
import type { JobRow } from './job-model';

/** The orders of the list of jobs, each along an index of its table. */
export const jobListOrders: Readonly<Record<JobOrder, ListOrder<JobRow>>> = {
  changed: { columns: { changedAt: 'instant', id: 'id' }, direction: 'DESC' },
  number: { columns: { year: 'whole', ordinal: 'whole' }, direction: 'DESC' },
  title: { columns: { title: 'text', id: 'id' }, direction: 'ASC' },
};
