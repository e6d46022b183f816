import { z } from 'zod';
import { nameSchema } from './farm';
import { emailSchema } from './password';
import { roles } from './vocabulary';

export const inviteSchema = z.object({
  email: emailSchema,
  name: nameSchema('person'),
  role: z.enum(roles, 'Choose the role.'),
  /** The farms a scout or grower is attached to; owners and agronomists see all. */
  farmIds: z.array(z.uuid()).max(500),
});
export type InviteInput = z.output<typeof inviteSchema>;

export const changeMemberSchema = z.object({ role: z.enum(roles), farmIds: z.array(z.uuid()).max(500) });
export type ChangeMemberInput = z.output<typeof changeMemberSchema>;
