import type { Brief } from '../contracts/appraisal'
import type { SizedPanel } from '../sizing/sizedPanel'
import type { AlsoFigure } from './alsoFigure'

const TABLES: Readonly<Record<Brief['basis'], string>> = {
  EN1992: 'EN 1992-1-2:2004, Tables 5.5, 5.6 and 5.8',
  BS8110: 'BS 8110-1:1997, Table 3.4 and Figure 3.2',
}

/**
 * Longest standard fire period that every panel of a scheme stands by the tables as it is sized, minutes, and what stops the next one.
 * Blocks and plaster count only where a test says so.
 *
 * Source: by the basis of the brief
 * @param panels - of one scheme, at least one
 */
export function fireFigure(panels: readonly SizedPanel[], { basis, fireMinutes }: Brief): AlsoFigure {
  const minutes = Math.min(...panels.map(({ fire }) => fire.minutes))
  const weakest = panels.filter(({ fire }) => fire.minutes === minutes)
  const limits = [...new Set(weakest.flatMap(({ fire }) => fire.limits))].map((limit) => limit.replace(/^fire: /, ''))
  const where = `${weakest[0]!.level} ${weakest[0]!.mark}${weakest.length > 1 ? ` and ${weakest.length - 1} more` : ''}`
  const stands = minutes === 0 ? 'Not even 30 minutes by the tables' : `Every panel stands ${minutes} minutes by the tables`
  const asked = fireMinutes === 0 ? 'the brief asks none' : `the brief asks ${fireMinutes}`
  const next = limits.length === 0 ? 'nothing longer is tabled' : `for longer, at ${where}: ${limits.join('; ')}`
  return {
    key: 'fire',
    value: minutes,
    working: `${stands}; ${asked}; ${next}`,
    source: `${TABLES[basis]}; blocks and plaster only by test`,
    lacks: [],
  }
}
