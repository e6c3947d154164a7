import type { Role } from '#shared/contracts/person'
import { AppError } from '../../errors'

/** Who asks, as the database has them at this request. */
export interface SignedIn {
  readonly sessionId: string
  readonly personId: string
  readonly firmId: string
  readonly name: string
  readonly email: string
  readonly roles: readonly Role[]
  readonly firmName: string
  readonly isDemo: boolean
}

/** True when the person holds one of the roles. */
export const hasRole = (who: SignedIn, ...allowed: Role[]): boolean => allowed.some((role) => who.roles.includes(role))

/** @throws AppError `forbidden` unless the person holds one of the roles */
export function requireRole(who: SignedIn, ...allowed: Role[]): void {
  if (!hasRole(who, ...allowed)) throw new AppError('forbidden')
}
