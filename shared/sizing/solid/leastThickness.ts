import { type Finding, isMet, utilisationOf } from '../finding'
import { remember } from '../remember'
import { bottomAlternatives } from './bars/chooseBottomBars'
import { chooseSlabBars } from './bars/chooseSlabBars'
import { topAlternatives } from './bars/chooseTopBars'
import { sizeFindings } from './layerFindings'
import { type SlabContext, slabKey } from './slabContext'

/**
 * Least thickness, the firm's step and greatest thickness that the engine chooses from, mm.
 *
 * Source: project rule, engine design section 3 (5 mm steps from 100 mm); greatest as the contract allows
 */
export const THICKNESS = { least: 100, step: 5, most: 1500 } as const

/** What a thicker slab can mend: the axis distance of bars in fire is for cover and diameter. */
export const isForThickness = ({ name }: Finding) => name !== 'fire.cover' && name !== 'cover.exposure'

const pass = (findings: readonly Finding[]) =>
  findings.every((finding) => !isForThickness(finding) || isMet(finding.demand, finding.capacity))

/**
 * Whether a panel has a set of bars that passes every check its thickness can mend.
 *
 * Source: project rule, engine design section 3
 */
export function canPass(context: SlabContext): boolean {
  return (
    pass(sizeFindings(context)) &&
    bottomAlternatives(context).some(({ short, long }) => pass(short()) && long.some((each) => pass(each()))) &&
    context.places.every((place) => topAlternatives(context, place).some((each) => pass(each())))
  )
}

function worstOf(context: SlabContext): number {
  const findings = [...chooseSlabBars(context).findings, ...sizeFindings(context)].filter(isForThickness)
  return findings.reduce((most, { demand, capacity }) => Math.max(most, utilisationOf(demand, capacity)), 0)
}

/**
 * First thickness at which every panel passes, mm. Where none does: of given bars the one nearest to passing, else the greatest.
 *
 * Source: project rule, engine design section 3
 * @param contextsAt - all panels of the scheme at a thickness
 */
export function leastThickness(contextsAt: (heightMm: number) => readonly SlabContext[]): number {
  let hardest = 0
  for (let heightMm: number = THICKNESS.least; heightMm <= THICKNESS.most; heightMm += THICKNESS.step) {
    const contexts = contextsAt(heightMm)
    const canPassFor = remember<boolean>()
    const passes = (i: number) => canPassFor(slabKey(contexts[i]!), () => canPass(contexts[i]!))
    const failing = passes(hardest) ? contexts.findIndex((_, i) => !passes(i)) : hardest
    if (failing < 0) return heightMm
    hardest = failing
  }
  return contextsAt(THICKNESS.most).some(({ given }) => given) ? nearest(contextsAt) : THICKNESS.most
}

/**
 * Thickness at which the worst check of some panels comes nearest to passing, mm; the least of equals.
 *
 * Source: project rule, what fails is shown at its best
 */
export function nearest(contextsAt: (heightMm: number) => readonly SlabContext[]): number {
  let best: { heightMm: number; worst: number } = { heightMm: THICKNESS.most, worst: Infinity }
  for (let heightMm: number = THICKNESS.least; heightMm <= THICKNESS.most; heightMm += THICKNESS.step) {
    const worst = Math.max(...contextsAt(heightMm).map(worstOf))
    if (worst < best.worst - 1e-9) best = { heightMm, worst }
  }
  return best.heightMm
}
