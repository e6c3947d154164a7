import { z } from 'zod'
import { role } from './person'
import { id, version } from './primitives'

/** Who may read a project: developers and engineers of the firm. */
export const projectReadersInput = z.strictObject({
  personIds: z
    .array(id)
    .max(100)
    .refine((ids) => new Set(ids).size === ids.length, 'expected every person once'),
})
export type ProjectReadersInput = z.infer<typeof projectReadersInput>

/** Everybody who could be a reader, each with whether they are one. `version` is that of the list: `If-Match` when it is changed. */
export const projectReaders = z.strictObject({
  version,
  people: z.array(z.strictObject({ id, name: z.string(), email: z.string(), roles: z.array(role), isReader: z.boolean() })),
})
export type ProjectReaders = z.infer<typeof projectReaders>
