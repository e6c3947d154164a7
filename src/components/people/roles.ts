import type { Role } from '#shared/contracts/person'

/** The roles and what each may, in the words of an admin. */
export const ROLES: readonly { readonly role: Role; readonly may: string }[] = [
  { role: 'surveyor', may: 'works on every project of the firm and sends comparisons' },
  { role: 'estimator', may: 'reads the rate books; of projects names and totals' },
  { role: 'developer', may: 'reads the comparison of projects shared with them' },
  { role: 'engineer', may: 'reads sizes and checks of projects shared with them, no money' },
  { role: 'client', may: 'reads what was sent to them' },
  { role: 'admin', may: 'invites people and sets their roles; no project figures' },
]
