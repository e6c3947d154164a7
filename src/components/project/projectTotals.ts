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

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1)
const many = (count: number) => `${numberInWords(count)} project${count === 1 ? '' : 's'}`

/** The list in one sentence: which floor costs less, and where. */
export function projectsInWords(projects: readonly ProjectSummary[]): string {
  const cheaper = projects.map((project) => projectTotals(project).cheaper).filter((kind) => kind !== null)
  const counts = {
    ribbed: cheaper.filter((kind) => kind === 'ribbed').length,
    solid: cheaper.filter((kind) => kind === 'solid').length,
  }
  if (counts.ribbed + counts.solid === 0) return capital(many(projects.length))
  const winner = counts.ribbed >= counts.solid ? 'ribbed' : 'solid'
  if (cheaper.length === 1) return `${capital(winner)} costs less in the one project priced`
  return counts[winner] === cheaper.length
    ? `${capital(winner)} costs less in ${cheaper.length === 2 ? 'both' : 'all ' + numberInWords(cheaper.length)} projects`
    : `${capital(winner)} costs less in ${numberInWords(counts[winner])} of ${many(cheaper.length)}`
}
