import type { Panel } from '../../contracts/appraisal'

/** What an edit of a level yields: its panels afterwards, or why it was refused, in words for the screen (nothing is changed then). */
export type EditOutcome = { readonly panels: Panel[] } | { readonly refused: string }
