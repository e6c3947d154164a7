import { z } from 'zod'
import { emailAddress, id, line } from './primitives'
import { role } from './person'

/** At sign-in any length is compared, so that an old short password gets the same answer as a wrong one. */
export const signInInput = z.strictObject({ email: emailAddress, password: z.string().min(1).max(128) })
export type SignInInput = z.infer<typeof signInInput>

/** A password being set: 15 to 128 characters, no composition rules (OWASP ASVS 5.0, 6.2). */
export const newPassword = z.string().min(15, 'expected at least 15 characters').max(128, 'expected at most 128 characters')

/** Who is signed in, and in which firm. */
export const session = z.strictObject({
  person: z.strictObject({ id, name: z.string(), email: z.string(), roles: z.array(role) }),
  firm: z.strictObject({ id, name: z.string(), isDemo: z.boolean() }),
  /** True in the local set-up only: `/mail` shows what arrived over SMTP. */
  hasLocalMail: z.boolean(),
})
export type Session = z.infer<typeof session>

export const passwordResetRequest = z.strictObject({ email: emailAddress })
export type PasswordResetRequest = z.infer<typeof passwordResetRequest>

const token = z.string().regex(/^[A-Za-z0-9_-]{43}$/, 'expected the token from the link')

export const passwordResetInput = z.strictObject({ token, password: newPassword })
export type PasswordResetInput = z.infer<typeof passwordResetInput>

export const invitationAcceptance = z.strictObject({ token, name: line(120), password: newPassword })
export type InvitationAcceptance = z.infer<typeof invitationAcceptance>
