import { z } from 'zod'
import { emailAddress, id, line, moment, version } from './primitives'

export const role = z.enum(['surveyor', 'estimator', 'developer', 'client', 'engineer', 'admin'])
export type Role = z.infer<typeof role>

export const roles = z.array(role).min(1).max(6)

export const person = z.strictObject({
  id,
  name: z.string(),
  email: z.string(),
  roles: z.array(role),
  /** invited: has not yet set a password; active; off: may not sign in */
  state: z.enum(['invited', 'active', 'off']),
  version,
  createdAt: moment,
})
export type Person = z.infer<typeof person>

/** Invites somebody: a link goes to the address. */
export const invitationInput = z.strictObject({ name: line(120), email: emailAddress, roles })
export type InvitationInput = z.infer<typeof invitationInput>

/** What an admin may change of a person. */
export const personChange = z.strictObject({ roles, state: z.enum(['active', 'off', 'invited']) })
export type PersonChange = z.infer<typeof personChange>
