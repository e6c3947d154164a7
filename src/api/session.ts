import type {
  InvitationAcceptance,
  PasswordResetInput,
  PasswordResetRequest,
  Session,
  SignInInput,
} from '#shared/contracts/session'
import { session } from '#shared/contracts/session'
import { command, request } from './http'

export const signIn = (input: SignInInput): Promise<Session> =>
  request(session, 'POST', '/api/session', { body: input, isSigningIn: true })

export const readSession = (): Promise<Session> => request(session, 'GET', '/api/session', { isSigningIn: true })

export const refreshSession = (): Promise<void> => command('POST', '/api/session/refresh', { body: {}, isSigningIn: true })

export const signOut = (): Promise<void> => command('DELETE', '/api/session')

/** Answers the same for every address. */
export const requestPasswordReset = (input: PasswordResetRequest): Promise<void> =>
  command('POST', '/api/password-resets', { body: input, isSigningIn: true })

export const redeemPasswordReset = (input: PasswordResetInput): Promise<void> =>
  command('POST', '/api/password-resets/redeem', { body: input, isSigningIn: true })

export const acceptInvitation = (input: InvitationAcceptance): Promise<void> =>
  command('POST', '/api/invitations/redeem', { body: input, isSigningIn: true })
