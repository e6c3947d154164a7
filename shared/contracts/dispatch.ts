import { z } from 'zod'
import { emailAddress, id, line, moment, version } from './primitives'

/** Somebody outside or inside the firm to whom comparisons of a project may be sent. */
export const contactInput = z.strictObject({ name: line(120), email: emailAddress })
export type ContactInput = z.infer<typeof contactInput>
export const contact = contactInput.extend({ id })
export type Contact = z.infer<typeof contact>

/** Sends the comparison of two schemes, as stored at this moment, to one contact. */
export const dispatchInput = z.strictObject({
  contactId: id,
  ribbedSchemeId: id,
  solidSchemeId: id,
  note: z.string().trim().max(2000),
})
export type DispatchInput = z.infer<typeof dispatchInput>

/** queued: waits for the server; sent: accepted by the mail server; refused: it said no for good; failed: given up after the stated tries. */
export const dispatchState = z.enum(['queued', 'sent', 'refused', 'failed'])
export type DispatchState = z.infer<typeof dispatchState>

export const dispatch = z.strictObject({
  id,
  projectId: id,
  projectName: z.string(),
  contact,
  between: z.tuple([z.string(), z.string()]),
  note: z.string(),
  state: dispatchState,
  tries: z.int(),
  /** What the mail server said last, where it was not yes. */
  lastAnswer: z.string().nullable(),
  messageId: z.string(),
  sentBy: z.string(),
  createdAt: moment,
  sentAt: moment.nullable(),
  version,
})
export type Dispatch = z.infer<typeof dispatch>
