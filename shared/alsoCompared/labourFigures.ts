import type { LabourFactors } from '../contracts/factors'
import { figure } from '../sizing/figure'
import type { SchemeMeasures } from '../takeoff/schemeMeasures'
import type { AlsoFigure, FigureKey } from './alsoFigure'
import { labourParts, labourSources } from './labourParts'
import { strikingTimes } from './strikingTimes'

const DAYS_PER_WEEK = 7
const STRIKING =
  'BS 8110-1:1997, Table 6.2, for screening whatever the basis of the brief; struck on the engineer’s word only. Hours by the firm’s outputs'

/**
 * Man-hours of a scheme, the days they take the least gang, and how long formwork and props of a floor of mean size stand: fixing,
 * reinforcing and concreting by that gang, then the striking time. Curing, and propping beyond what the soffit's output holds, are not in.
 *
 * Source: outputs by the firm; BS 8110-1:1997, Table 6.2
 */
export function labourFigures(measures: SchemeMeasures, labour: LabourFactors): AlsoFigure[] {
  const parts = labourParts(measures, labour)
  const hours = parts.reduce((sum, part) => sum + part.hours, 0)
  const { leastGang, hoursPerDay } = labour
  const days = gangDays(hours, labour)
  const gang = `${figure(hours)} h / (${leastGang} people × ${hoursPerDay} h) = ${figure(days)} days`
  return [
    figureOf(
      'labourHours',
      hours,
      `${parts.map(({ working }) => working).join('; ')}; together ${figure(hours)} h`,
      labourSources(labour),
    ),
    figureOf('gangDays', days, gang, 'Least gang and hours a day by the firm'),
    ...timeFigures(measures, labour, days),
  ]
}

const gangDays = (hours: number, { leastGang, hoursPerDay }: LabourFactors) => hours / (leastGang * hoursPerDay)

/**
 * Weeks that the man-hours of a scheme take its least gang, working days a week apart: what preliminaries by the week are charged for.
 *
 * Source: outputs, gang, hours and days by the firm
 */
export function gangWeeks(measures: SchemeMeasures, labour: LabourFactors): number {
  const hours = labourParts(measures, labour).reduce((sum, part) => sum + part.hours, 0)
  return gangDays(hours, labour) / labour.daysPerWeek
}

function timeFigures({ soffitM2, floorCount }: SchemeMeasures, labour: LabourFactors, days: number): AlsoFigure[] {
  const { daysPerWeek, airTemperature } = labour
  const { soffitDays, propDays, working } = strikingTimes(airTemperature)
  const building = days / floorCount / daysPerWeek
  const [formwork, props] = [building + soffitDays / DAYS_PER_WEEK, building + propDays / DAYS_PER_WEEK]
  const built = `${figure(days)} days / ${floorCount} floors / ${daysPerWeek} a week`
  const weeks = (struck: number, value: number) =>
    `${working}; ${built} + ${figure(struck)}/${DAYS_PER_WEEK} = ${figure(value, 2)} weeks`
  const area = `${figure(soffitM2, 2)} m²`
  const areaWeeks = (value: number) => `${area} × ${figure(value, 2)} weeks = ${figure(soffitM2 * value, 0)} m²·weeks`
  return [
    figureOf('formworkWeeks', formwork, weeks(soffitDays, formwork), STRIKING),
    figureOf('proppingWeeks', props, weeks(propDays, props), STRIKING),
    figureOf('soffitArea', soffitM2, `full deck between supports, large voids deducted: ${area}`, 'Quantities of this scheme'),
    figureOf('soffitAreaWeeks', soffitM2 * formwork, areaWeeks(formwork), STRIKING),
    figureOf('propAreaWeeks', soffitM2 * props, areaWeeks(props), STRIKING),
  ]
}

const figureOf = (key: FigureKey, value: number, working: string, source: string): AlsoFigure => ({
  key,
  value,
  working,
  source,
  lacks: [],
})
