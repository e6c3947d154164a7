import type { Edge } from '../../contracts/appraisal'

/** An edge without what was typed to go on behind it. */
export function withoutBeyond({ supportWidth, kind, continuity }: Edge): Edge {
  return { supportWidth, kind, continuity }
}
