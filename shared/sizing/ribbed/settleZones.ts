import type { RibAnalysis } from './ribAnalysis'
import { chooseBottom, isZoneWideEnough, lightestTops } from './ribDesign'
import type { RibbedPanel } from './ribbedPanel'
import { type LaidLevel, laidLevel, reinforcementKey, type RibbedJob, taskOf } from './ribbedJob'
import { leastZoneMm, ZONE_STEP_MM } from './solidZones'

/**
 * Rounds in which a zone may also become narrower again, because bars chosen for the weight of the last round carry more shear; later it
 * only widens, so that the search ends.
 *
 * Source: project rule
 */
const FREE_ROUNDS = 6

/** Times that zones which have settled are tried one step narrower. Source: project rule, so that the search ends */
const TRIALS = 4

/**
 * The level with a solid zone at every panel just wide enough: given, or the least in steps at which the panel's ribs shear and bend
 * with the bars and the weight that go with it.
 *
 * Source: project rule, engine design section 4 (`"least"` lets shear widen the zone, a number is used as given)
 */
export function settleZones(job: RibbedJob): LaidLevel {
  const { solidZone } = job.scheme
  const count = job.level.panels.length
  if (solidZone !== 'least') return laidLevel(job, new Array<number>(count).fill(solidZone))
  let settled = widen(job, laidLevel(job, new Array<number>(count).fill(0)), FREE_ROUNDS)
  for (let trial = 0; trial < TRIALS; trial += 1) {
    const narrower = narrowed(job, settled)
    if (!narrower) return settled
    settled = widen(job, narrower, 0)
  }
  return settled
}

/** Zones taken to what the loads of their layout ask, until layout and zones agree. */
function widen(job: RibbedJob, start: LaidLevel, freeRounds: number): LaidLevel {
  let laid = start
  for (let round = 0; ; round += 1) {
    const zones = laid.panels.map((panel, i) => {
      const fromMm = round < freeRounds ? 0 : panel.solidZoneMm
      return zoneOf(job, panel, laid.analyses[i]!, fromMm)
    })
    if (zones.every((zone, i) => zone === laid.zones[i])) return laid
    laid = laidLevel(job, zones)
  }
}

function zoneOf(job: RibbedJob, panel: RibbedPanel, analysis: RibAnalysis, fromMm: number): number {
  return job.zoneFor(`${fromMm} ${reinforcementKey(panel, analysis)}`, () => {
    const task = taskOf(job, panel, analysis)
    const [bottom, lightest] = [chooseBottom(task), lightestTops(task)]
    return leastZoneMm(fromMm, panel.clearMm, (zoneMm) =>
      isZoneWideEnough(taskOf(job, panel, analysis, zoneMm), bottom, lightest),
    )
  })
}

/** The level with those zones a step narrower that do as well under the loads they then have; null where none does. */
function narrowed(job: RibbedJob, { zones }: LaidLevel): LaidLevel | null {
  const trial = laidLevel(
    job,
    zones.map((zone) => Math.max(0, zone - ZONE_STEP_MM)),
  )
  const next = zones.map((zone, i) => (zone > 0 && does(job, trial.panels[i]!, trial.analyses[i]!) ? trial.zones[i]! : zone))
  return next.some((zone, i) => zone < zones[i]!) ? laidLevel(job, next) : null
}

function does(job: RibbedJob, panel: RibbedPanel, analysis: RibAnalysis): boolean {
  const task = taskOf(job, panel, analysis)
  return isZoneWideEnough(task, chooseBottom(task), lightestTops(task))
}
