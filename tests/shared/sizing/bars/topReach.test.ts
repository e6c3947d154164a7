/** Top bars over the support between spans too uneven for the usual 0.3 of the clear span, the arithmetic written out. */
import { describe, expect, it } from 'vitest'
import type { AppraisalFile } from '#shared/contracts/appraisal'
import type { BarRun } from '#shared/sizing/sizedPanel'
import { sizeScheme } from '#shared/sizing/sizeScheme'
import { britishFileOf, fileOf, ribbed, row, schemeOf, solid } from '../support/floors'

const DEEP_MM = 15_000
const thick = schemeOf({ ...solid, thickness: 200 })

/** Self-weight 5 and finishes 1.5 kN/m² with `onPermanent`, imposed load and partitions 2.8 with `onVariable`; kN/m². */
const loadsOf = (onPermanent: number, onVariable: number) => 6.5 * onPermanent + 2.8 * onVariable

/**
 * How far the second of two spans hogs from the support between, as a share of it: the first loaded, the second not.
 * M = (w1·l1³ + w2·l2³)/(8·(l1 + l2)) by three moments; the moment is nil at 2·R/w2 from the outer end, R = w2·l2/2 − M/l2.
 */
function hoggingShare([l1, l2]: readonly [number, number], loaded: number, unloaded: number): number {
  const moment = (loaded * l1 ** 3 + unloaded * l2 ** 3) / (8 * (l1 + l2))
  return 1 - (2 * (unloaded * (l2 / 2) - moment / l2)) / unloaded / l2
}

function topBarsOf(file: AppraisalFile) {
  return sizeScheme(thick, file).panels.map(({ bars, flags }) => ({
    bars: bars.filter(({ position }) => /^top, edge (2|4)/.test(position)),
    flags: flags.filter((flag) => flag.includes('hogs')),
  }))
}

const overMiddle = (bars: readonly BarRun[]) => bars.find(({ position }) => position.startsWith('top, edge 2'))!

/** Reach into the second panel: what stands last in the working before the sum. */
const lastTerm = (working: string) => Number(/([\d.]+) = /.exec(working)![1])

describe('solid spans of 6.0 and 4.5 m side by side', () => {
  it('by EN 1992-1-1 run d and ten diameters past the hogging of the shorter', () => {
    const file = fileOf(row([6000, 4500], DEEP_MM))
    const share = hoggingShare([5.95, 4.45], loadsOf(1.35, 1.5), loadsOf(1.35, 0))
    const [first, second] = topBarsOf(file)
    const { diameter, lengthWorking } = overMiddle(first!.bars)
    expect(share).toBeGreaterThan(0.3)
    expect(lastTerm(lengthWorking)).toBeCloseTo(share * 4250 + (200 - 25) + Math.max(10 * diameter, 100), 0)
    expect(second!.flags).toHaveLength(1)
    expect(second!.flags[0]).toContain(`${Math.round(100 * share)} % of the span`)
    expect(first!.flags).toEqual([])
  })

  it('by BS 8110-1 run the greater of d and twelve diameters past it', () => {
    const share = hoggingShare([6, 4.5], loadsOf(1.4, 1.6), loadsOf(1, 0))
    const [first] = topBarsOf(britishFileOf(row([6000, 4500], DEEP_MM)))
    const { diameter, lengthWorking } = overMiddle(first!.bars)
    expect(share).toBeGreaterThan(0.3)
    expect(lastTerm(lengthWorking)).toBeCloseTo(share * 4250 + Math.max(200 - 25, 12 * diameter), 0)
  })

  it('keep to 0.3 of the clear span where spans differ by 15 % at most', () => {
    for (const { bars, flags } of topBarsOf(fileOf(row([5000, 4500], DEEP_MM)))) {
      expect(flags).toEqual([])
      expect(
        bars.filter(({ position }) => position !== 'top, edge 1').every(({ clause }) => /common|9\.3\.1\.2/.test(clause)),
      ).toBe(true)
    }
  })
})

describe('a short span of ribs that hogs all along', () => {
  it('has the top bars of both its ends meet in a lap', () => {
    const block = { length: 200, width: 400, height: 250, mass: 15 }
    const scheme = schemeOf({ ...ribbed, block, ribWidth: 150, solidZone: 800 })
    const { panels } = sizeScheme(scheme, fileOf(row([7000, 4000, 6000], 6000)))
    const over = panels[1]!.bars.filter(({ position, diameter }) => position === 'top, edge 4' && diameter === 16)
    // (3750 + lap)/2, the lap of a φ16 in poor bond 1.5·16/4·435/(2.25·0.7·0.7·2.8965/1.5) = 1226.
    const lapMm = (1.5 * (16 / 4) * 435) / ((2.25 * 0.7 * 0.7 * 0.3 * 30 ** (2 / 3)) / 1.5)
    expect(over.length).toBeGreaterThan(0)
    for (const { lengthWorking, clause } of over) {
      expect(Number(/^[\d.]+/.exec(lengthWorking)![0])).toBeCloseTo((3750 + lapMm) / 2, 2)
      expect(clause).toBe('EN 1992-1-1 9.2.1.3(2)')
    }
    expect(panels[1]!.flags.filter((flag) => flag.includes('hogs all along the span'))).toHaveLength(2)
  })
})
