import * as z from 'zod';
import { roleSchema, rolesSchema } from '#shared/actor/role-schema';
import { emailAddress, identifier, instant, line, version } from '#shared/problems/entry-schema';

/** A person of the workshop as their colleagues see them. */
export const colleagueSchema = z.strictObject({
  membershipId: identifier,
  accountId: identifier,
  name: z.string(),
  roles: z.array(roleSchema),
  isDisabled: z.boolean(),
});

/** A person of the workshop as an owner or estimator sees them. */
export const personSchema = z.strictObject({ ...colleagueSchema.shape, email: z.string(), joinedAt: instant, version });

export const invitationSchema = z.strictObject({
  id: identifier,
  name: z.string(),
  email: z.string(),
  roles: z.array(roleSchema),
  sentAt: instant,
  endsAt: instant,
});

export const newInvitationSchema = z.strictObject({ name: line(120), email: emailAddress, roles: rolesSchema });

/** What an invited person sees before they accept; `isKnown` says that they enter the password they already have. */
export const invitationReadingSchema = z.strictObject({
  workshopName: z.string(),
  name: z.string(),
  email: z.string(),
  isKnown: z.boolean(),
});

export type Colleague = z.infer<typeof colleagueSchema>;
export type WorkshopPerson = z.infer<typeof personSchema>;
export type Invitation = z.infer<typeof invitationSchema>;
export type NewInvitation = z.infer<typeof newInvitationSchema>;
export type InvitationReading = z.infer<typeof invitationReadingSchema>;
