import * as z from 'zod';
import { identifier } from '#shared/problems/entry-schema';

/** The alternatives a client takes; none is the base. What is offered is known to the issue alone. */
export const choiceSchema = z.array(identifier).max(24);
