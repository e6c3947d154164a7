import { OutOfScopeError } from '../../outOfScope'
import type { Answer, FireDemand } from '../codeBasis'
import { type FireCover, FIRE_COVER_MM, FIRE_SIZES_MM } from '../tables/nominalFireCover'
import type { FirePeriod } from '../tables/slabFireSizes'

const PERIODS = Object.keys(FIRE_SIZES_MM).map(Number)

function isPeriod(minutes: number): minutes is FirePeriod {
  return PERIODS.includes(minutes)
}

function periodOf(minutes: number): FirePeriod {
  if (!isPeriod(minutes)) throw new OutOfScopeError('brief.fireMinutes', `expected one of ${PERIODS.join(', ')}`)
  return minutes
}

/** Cover over which concrete may spall in fire, mm. Source: BS 8110-1:1997, Table 3.4, note 2 (from memory) */
const SPALLING_MM = 40

function demand(minutes: number, member: 'floor' | 'rib', cover: FireCover, isContinuous: boolean): FireDemand {
  const period = periodOf(minutes)
  const sizeMm = FIRE_SIZES_MM[period][member]
  const coverMm = FIRE_COVER_MM[period][cover]
  const hours = minutes / 60
  const held = isContinuous ? 'continuous' : 'simply supported'
  const spalling = coverMm > SPALLING_MM ? `, over ${SPALLING_MM} with measures against spalling (BS 8110-2 section 4)` : ''
  const size: Answer = {
    value: sizeMm,
    clause: 'BS 8110-1 Figure 3.2',
    working: () => `${hours} h: ${member === 'rib' ? 'b' : 'h'} ≥ ${sizeMm} mm`,
  }
  const bars: Answer = {
    value: coverMm,
    clause: 'BS 8110-1 Table 3.4',
    working: () => `${hours} h, ${member}, ${held}: nominal cover ≥ ${coverMm} mm${spalling}`,
  }
  return { size, bars, measuredTo: 'cover', sideAxisMm: null }
}

/**
 * Least thickness and nominal cover of a solid slab, or of the topping of a ribbed one, in fire.
 *
 * Source: BS 8110-1:1997, 3.3.6, Table 3.4 (floors) and Figure 3.2 (see tables/nominalFireCover)
 * @throws OutOfScopeError `brief.fireMinutes` for a period the table does not have
 */
export function slabFire(minutes: number, isContinuous: boolean): FireDemand {
  return demand(minutes, 'floor', isContinuous ? 'floorContinuous' : 'floorSimple', isContinuous)
}

/**
 * Least width and nominal cover of a rib in fire.
 *
 * Source: BS 8110-1:1997, 3.3.6, Table 3.4 (ribs) and Figure 3.2 (see tables/nominalFireCover)
 * @throws OutOfScopeError `brief.fireMinutes` for a period the table does not have
 */
export function ribFire(minutes: number, isContinuous: boolean): FireDemand {
  return demand(minutes, 'rib', isContinuous ? 'ribContinuous' : 'ribSimple', isContinuous)
}
