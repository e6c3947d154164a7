/** One numbered word of the head. */
export interface SheetLink {
  /** As '01'. */
  readonly number: string
  readonly word: string
  /** Address of the sheet. */
  readonly to: string
  readonly isCurrent: boolean
}
