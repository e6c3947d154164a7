import type { Role } from '#shared/contracts/person'
import type { RouteName } from './routeName'

/** Where somebody starts, by the first of their roles that has a screen of its own. */
export function homeOf(roles: readonly Role[]): RouteName {
  if (roles.some((role) => role === 'surveyor' || role === 'estimator' || role === 'developer' || role === 'engineer'))
    return 'projects'
  if (roles.includes('client')) return 'received'
  return 'people'
}
