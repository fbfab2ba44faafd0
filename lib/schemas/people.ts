/** Members and invitations of a workshop, as their routes take and answer them. */

import { z } from 'zod';
import { emailSchema } from './account';
import { roleSchema } from './api';

export const memberSchema = z.object({
  id: z.uuid(),
  name: z.string(),
  email: z.string(),
  role: roleSchema,
  since: z.iso.datetime(),
});
export type Member = z.infer<typeof memberSchema>;

export const invitationSchema = z.object({
  id: z.uuid(),
  email: z.string(),
  role: roleSchema,
  invitedBy: z.string(),
  at: z.iso.datetime(),
  expiresAt: z.iso.datetime(),
  expired: z.boolean(),
});
export type Invitation = z.infer<typeof invitationSchema>;

export const peopleSchema = z.object({
  members: z.array(memberSchema),
  /** Neither used nor withdrawn; none for those who may not invite. */
  invitations: z.array(invitationSchema),
});
export type People = z.infer<typeof peopleSchema>;

const askedRoleSchema = z.enum(roleSchema.options, {
  error: `Role: not one of ${roleSchema.options.join(', ')}; choose one of them`,
});

export const inviteSchema = z.object({ email: emailSchema, role: askedRoleSchema });

export const setRoleSchema = z.object({ role: askedRoleSchema });
