import type { ProjectSummary } from '#shared/contracts/project'
import { Decimal } from '#shared/pricing/decimal'

/** First ribbed and first solid scheme of a project, as they are compared; null where one of them has no total. */
export interface ProjectTotals {
  readonly ribbed: string | null
  readonly solid: string | null
  /** Ribbed less solid. */
  readonly difference: string | null
  readonly cheaper: 'ribbed' | 'solid' | 'neither' | null
}

export function projectTotals({ totals }: Pick<ProjectSummary, 'totals'>): ProjectTotals {
  const totalOf = (kind: 'ribbed' | 'solid') => totals.find((row) => row.kind === kind)?.total ?? null
  const [ribbed, solid] = [totalOf('ribbed'), totalOf('solid')]
  if (ribbed === null || solid === null) return { ribbed, solid, difference: null, cheaper: null }
  const difference = new Decimal(ribbed).minus(solid)
  const cheaper = difference.isZero() ? 'neither' : difference.isNegative() ? 'ribbed' : 'solid'
  return { ribbed, solid, difference: difference.toFixed(), cheaper }
}

const NUMBERS = ['no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine', 'ten', 'eleven', 'twelve']
export const numberInWords = (count: number): string => NUMBERS[count] ?? String(count)

/** The list in one sentence: where which floor costs less. */
export function projectsInWords(projects: readonly ProjectSummary[]): string {
  const totals = projects.map(projectTotals)
  const priced = totals.filter(({ cheaper }) => cheaper !== null)
  const ribbed = priced.filter(({ cheaper }) => cheaper === 'ribbed').length
  const many = (count: number) => `${numberInWords(count)} project${count === 1 ? '' : 's'}`
  const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1)
  if (priced.length === 0) return capital(many(projects.length))
  if (ribbed === priced.length)
    return `Ribbed costs less in ${priced.length === 1 ? 'the one project priced' : `all ${many(ribbed)}`}`
  return ribbed === 0
    ? `Ribbed costs less in none of ${many(priced.length)}`
    : `Ribbed costs less in ${numberInWords(ribbed)} of ${many(priced.length)}`
}
