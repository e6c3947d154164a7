import type { Answer, FireDemand, SlabAction } from '../codeBasis'
import { figure } from '../figure'
import { OutOfScopeError } from '../../outOfScope'
import { CONTINUOUS_BEAM_FIRE_SIZES, SIDE_AXIS_ADDITION_MM, SIMPLE_BEAM_FIRE_SIZES } from '../tables/beamFireSizes'
import { interpolate } from '../tables/interpolate'
import { type FirePeriod, SLAB_FIRE_SIZES } from '../tables/slabFireSizes'

const PERIODS = Object.keys(SLAB_FIRE_SIZES).map(Number)

function isPeriod(minutes: number): minutes is FirePeriod {
  return PERIODS.includes(minutes)
}

function periodOf(minutes: number): FirePeriod {
  if (!isPeriod(minutes)) throw new OutOfScopeError('brief.fireMinutes', `expected one of ${PERIODS.join(', ')}`)
  return minutes
}

const answer = (value: number, clause: string, working: () => string): Answer => ({ value, clause, working })

/**
 * Least thickness and axis distance of a solid slab, or of the flange of a ribbed one, in fire.
 *
 * Source: EN 1992-1-2:2004, 5.7.2 and Table 5.8 (see SLAB_FIRE_SIZES)
 * @throws OutOfScopeError `brief.fireMinutes` for a period the table does not have
 */
export function slabFire(minutes: number, action: SlabAction): FireDemand {
  const row = SLAB_FIRE_SIZES[periodOf(minutes)]
  const clause = 'EN 1992-1-2 5.7.2, Table 5.8'
  return {
    size: answer(row.thicknessMm, clause, () => `REI ${minutes}: hs ≥ ${row.thicknessMm} mm`),
    bars: answer(row[action], clause, () => `REI ${minutes}: a ≥ ${row[action]} mm`),
    measuredTo: 'axis',
    sideAxisMm: null,
  }
}

/** Redistribution of support moments up to which Table 5.6 holds. Source: EN 1992-1-2:2004, 5.6.3(2) (from memory) */
const GREATEST_REDISTRIBUTION = 0.15

/**
 * Least width and axis distance of a rib in fire, checked as a beam: continuous where it is so and not redistributed over 15 %.
 *
 * Source: EN 1992-1-2:2004, 5.7.5(1), 5.6.2, 5.6.3, Tables 5.5 and 5.6, in a straight line between columns
 * @throws OutOfScopeError `brief.fireMinutes` for a period the table does not have
 */
export function ribFire(minutes: number, ribMm: number, isContinuous: boolean, redistributedShare: number): FireDemand {
  const byTable56 = isContinuous && redistributedShare <= GREATEST_REDISTRIBUTION
  const pairs = (byTable56 ? CONTINUOUS_BEAM_FIRE_SIZES : SIMPLE_BEAM_FIRE_SIZES)[periodOf(minutes)]
  const widths = pairs.map(([width]) => width)
  const axis = interpolate(
    widths,
    pairs.map(([, axisMm]) => axisMm),
    ribMm,
  )
  const clause = `EN 1992-1-2 5.7.5, Table ${byTable56 ? '5.6' : '5.5'}`
  const side = axis + SIDE_AXIS_ADDITION_MM
  return {
    size: answer(widths[0]!, clause, () => `R ${minutes}: b ≥ ${widths[0]} mm`),
    bars: answer(axis, clause, () => `R ${minutes}, b = ${figure(ribMm)}: a ≥ ${figure(axis)} mm`),
    measuredTo: 'axis',
    sideAxisMm:
      ribMm <= widths[1]!
        ? answer(side, clause, () => `R ${minutes}: asd ≥ a + ${SIDE_AXIS_ADDITION_MM} = ${figure(side)} mm`)
        : null,
  }
}
