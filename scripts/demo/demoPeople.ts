import type { Role } from '#shared/contracts/person'

/** The people of the demo firm: each is a role. */
export const DEMO_PEOPLE: readonly { name: string; email: string; roles: readonly Role[] }[] = [
  { name: 'Demo surveyor', email: 'surveyor@example.test', roles: ['surveyor'] },
  { name: 'Demo estimator', email: 'estimator@example.test', roles: ['estimator'] },
  { name: 'Demo checker', email: 'checker@example.test', roles: ['estimator'] },
  { name: 'Demo developer', email: 'developer@example.test', roles: ['developer'] },
  { name: 'Demo client', email: 'client@example.test', roles: ['client'] },
  { name: 'Demo engineer', email: 'engineer@example.test', roles: ['engineer'] },
  { name: 'Demo admin', email: 'admin@example.test', roles: ['admin'] },
]
