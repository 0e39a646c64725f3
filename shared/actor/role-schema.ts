import * as z from 'zod';
import { roles } from '#shared/actor/role';

export const roleSchema = z.enum(roles);

/** The roles one person holds in a workshop: at least one, none twice. */
export const rolesSchema = z
  .array(roleSchema)
  .min(1)
  .max(roles.length)
  .refine((held) => new Set(held).size === held.length);
