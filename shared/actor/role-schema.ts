import * as z from 'zod';
import { roles } from '#shared/actor/role';
import { complain } from '#shared/problems/complaints-of';

export const roleSchema = z.enum(roles);

/** The roles one person holds in a workshop: at least one, none twice. */
export const rolesSchema = z
  .array(roleSchema)
  .refine((held) => held.length > 0, complain('roles-none'))
  .max(roles.length)
  .refine((held) => new Set(held).size === held.length);
