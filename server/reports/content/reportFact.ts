/** A fact under a short heading, as the report lists them. */
export interface ReportFact {
  readonly title: string
  readonly text: string
}
