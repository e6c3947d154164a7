import type { Brief } from '#shared/contracts/appraisal'
import type { SchemeResult } from '#shared/contracts/appraisalResult'
import type { StoredLevel } from '#shared/contracts/project'
import type { ProjectReading } from '#shared/contracts/projectReading'
import { basisWithNote } from '#shared/sizing/basisName'
import { formatDay } from '../base/formatMoment'
import { checkInWords } from '../check/checkInWords'
import type { Pair } from './phrase'

export interface BriefFact {
  readonly label: string
  readonly value: string
  readonly isWrong?: boolean
}

type UsedEdition = NonNullable<ProjectReading['edition']>

/** Lines of 'Both schemes answer the same brief'. */
export function briefFacts(
  brief: Brief,
  levels: readonly StoredLevel[],
  edition: UsedEdition | null,
  pair: Pair<SchemeResult> | null,
): BriefFact[] {
  const strength = brief.basis === 'EN1992' ? `fck ${brief.fck}, fyk ${brief.fyk} MPa` : `fcu ${brief.fcu}, fy ${brief.fy} MPa`
  const partitions = brief.partitionsLoad > 0 ? `, ${brief.partitionsLoad}` : ''
  return [
    { label: 'Sides of panels, on support lines', value: sides(levels) },
    {
      label: `Imposed, finishes and services${partitions ? ', partitions' : ''}`,
      value: `${brief.imposedLoad}, ${Number((brief.finishesLoad + brief.servicesLoad).toFixed(3))}${partitions} kN/m²`,
    },
    { label: 'Fire, cover', value: `${brief.fireMinutes === 0 ? 'none asked' : `${brief.fireMinutes} min`}, ${brief.cover} mm` },
    { label: 'Concrete and bars', value: strength },
    { label: 'Sized by', value: basisWithNote(brief) },
    {
      label: 'Rates',
      value: edition ? `${edition.region}, edition ${edition.number}, of ${formatDay(edition.baseDate)}` : 'no edition chosen',
    },
    ...(pair === null ? [] : [checks(pair)]),
  ]
}

function sides(levels: readonly StoredLevel[]): string {
  const lengths = levels.flatMap(({ panels }) =>
    panels.flatMap(({ outline }) =>
      [0, 1].map((axis) => {
        const values = outline.map((point) => point[axis]!)
        return Math.max(...values) - Math.min(...values)
      }),
    ),
  )
  if (lengths.length === 0) return 'no panels yet'
  const metres = (mm: number) => String(Number((mm / 1000).toFixed(2)))
  const [least, greatest] = [metres(Math.min(...lengths)), metres(Math.max(...lengths))]
  return least === greatest ? `${least} m` : `${least} to ${greatest} m`
}

function checks({ ribbed, solid }: Pair<SchemeResult>): BriefFact {
  const all = [ribbed, solid].flatMap((scheme) => scheme.checks.map((check) => ({ scheme: scheme.mark, check })))
  const failing = all.filter(({ check }) => !check.pass)
  if (failing.length > 0) {
    const schemes = [...new Set(failing.map(({ scheme }) => scheme))].join(' and ')
    return { label: 'Checks', value: `${failing.length} of ${all.length} fail, in ${schemes}`, isWrong: true }
  }
  const [first, ...rest] = all
  if (first === undefined) return { label: 'Checks', value: 'none made' }
  const tightest = rest.reduce((best, one) => (one.check.utilisation > best.check.utilisation ? one : best), first)
  return {
    label: 'Checks',
    value: `all pass; tightest ${tightest.check.utilisation.toFixed(2)}, ${tightest.scheme} ${tightest.check.panel}, ${checkInWords(tightest.check.name).toLowerCase()}`,
  }
}
