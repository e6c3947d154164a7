import { z } from 'zod'

/** A row of what is compared beside the cost, as it stood when it was sent. It holds no money. */
export const frozenAlsoRow = z.strictObject({
  key: z.string(),
  group: z.string(),
  label: z.string(),
  unit: z.string(),
  decimals: z.int(),
  ribbed: z.number().nullable(),
  solid: z.number().nullable(),
  better: z.enum(['ribbed', 'solid', 'same']).nullable(),
  /** Where the ribbed floor is worse, or why neither is called better; may be empty. */
  remark: z.string(),
  /** Formulas with numbers; null where they would tell the firm's own outputs. */
  workings: z.strictObject({ ribbed: z.string(), solid: z.string() }).nullable(),
  source: z.string(),
})

/** An entry of the same-scope list as both schemes stood to it, without rates. */
export const frozenScopeRow = z.strictObject({
  name: z.string(),
  states: z.strictObject({ ribbed: z.string(), solid: z.string() }),
  isInTotal: z.strictObject({ ribbed: z.boolean(), solid: z.boolean() }),
  notes: z.strictObject({ ribbed: z.string(), solid: z.string() }),
})

/** Whether both totals hold the same. `unequal`: in what they do not, a sentence; empty where nothing is known to differ. */
export const frozenScope = z.strictObject({ unequal: z.string(), undeclared: z.int(), rows: z.array(frozenScopeRow) })

export type FrozenAlsoRow = z.infer<typeof frozenAlsoRow>
export type FrozenScope = z.infer<typeof frozenScope>
