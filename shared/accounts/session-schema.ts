import * as z from 'zod';
import { enteredPassword } from '#shared/accounts/password-schema';
import { workshopSchema } from '#shared/accounts/workshop-schema';
import { roleSchema } from '#shared/actor/role-schema';
import { emailAddress, identifier, instant } from '#shared/problems/entry-schema';

const membershipSchema = z.strictObject({ id: identifier, workshopName: z.string(), roles: z.array(roleSchema) });

/** Who is signed in, in which workshop, and where else they might be. */
export const signedInSchema = z.strictObject({
  accountId: identifier,
  name: z.string(),
  email: z.string(),
  memberships: z.array(membershipSchema),
  membership: membershipSchema.optional(),
  workshop: workshopSchema
    .pick({
      ...{ id: true, name: true, locale: true, currency: true, lengthUnit: true, timeZone: true, paperSize: true },
      defaultTaxCategory: true,
    })
    .optional(),
});

/** The session: the token every changing request must carry, and who it speaks for, if anybody. */
export const sessionSchema = z.strictObject({ token: z.string(), signedIn: signedInSchema.nullable() });

export const signInSchema = z.strictObject({ email: emailAddress, password: enteredPassword });

/** One of a person's own sessions, on whatever machine. */
export const ownSessionSchema = z.strictObject({
  id: z.string(),
  agent: z.string(),
  startedAt: instant,
  seenAt: instant,
  isThisOne: z.boolean(),
});

export type SessionAnswer = z.infer<typeof sessionSchema>;
export type SignedInAnswer = z.infer<typeof signedInSchema>;
export type OwnSession = z.infer<typeof ownSessionSchema>;
