import * as z from 'zod';
import { identifier } from '#shared/problems/entry-schema';

/** What is said before a plain invoice is begun: whom it is for, and of which job. */
export const newInvoiceSchema = z.strictObject({ clientId: identifier, jobId: identifier.nullable() });
