import type { Brief } from '../contracts/appraisal'

/** Names of the codes of practice as sheets and reports write them; `note` where a reader must know more. */
const NAMES: Readonly<Record<Brief['basis'], { readonly name: string; readonly note: string | null }>> = {
  EN1992: { name: 'EN 1992-1-1', note: null },
  BS8110: { name: 'BS 8110-1:1997', note: 'withdrawn in 2010' },
}

/**
 * The code that a brief is sized by.
 *
 * Source: project rule, the screen says that BS 8110 was withdrawn (engine design section 4)
 */
export function basisName({ basis }: Pick<Brief, 'basis'>): string {
  return NAMES[basis].name
}

/**
 * The code that a brief is sized by, with what a reader must know of it, as `BS 8110-1:1997, withdrawn in 2010`.
 *
 * Source: project rule, see `basisName`
 */
export function basisWithNote({ basis }: Pick<Brief, 'basis'>): string {
  const { name, note } = NAMES[basis]
  return note === null ? name : `${name}, ${note}`
}
