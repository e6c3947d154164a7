import { invitationAcceptance, passwordResetInput, passwordResetRequest } from '#shared/contracts/session'
import { Router } from 'express'
import type { EntityManager } from 'typeorm'
import { parse } from '../errors'
import { acceptInvitation, countResetRequest, resetPassword, sendPasswordReset } from '../services/session/newPassword'
import type { SessionSettings } from '../services/session/sessionSettings'

/** Setting a password by a link from a mail: open to everybody. */
export function passwordRoutes(db: EntityManager, settings: SessionSettings): Router {
  return Router()
    .post('/password-resets', async (request, response) => {
      const input = parse(passwordResetRequest, request.body)
      await countResetRequest(db, request.ip ?? 'unknown')
      response.status(202).json({})
      await sendPasswordReset(db, settings, input)
    })
    .post('/password-resets/redeem', async (request, response) => {
      await resetPassword(db, parse(passwordResetInput, request.body))
      response.status(204).end()
    })
    .post('/invitations/redeem', async (request, response) => {
      await acceptInvitation(db, parse(invitationAcceptance, request.body))
      response.status(204).end()
    })
}
