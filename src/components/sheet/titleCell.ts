/** One cell of a title block. */
export interface TitleCell {
  readonly label: string
  readonly value: string
}
