import { remember } from '../remember'
import { canPass, nearest, THICKNESS } from './leastThickness'
import { type SlabContext, slabKey } from './slabContext'

/** Times that all panels are tried one step thinner once they pass. Source: project rule, so that the search ends */
const TRIALS = 4

/**
 * Thickness of every panel of a level, each the least at which it passes beside the others, mm. All start at the least thickness;
 * those that fail grow by a step and all are analysed again, until none fails; then each is tried a step thinner. So no single panel
 * can lose a step. A panel that passes at no thickness gets what `leastThickness` gives such panels.
 *
 * Source: project rule, engine design sections 1 and 3 (thickness per panel where the scheme asks for it)
 * @param contextsAt - the panels of the level at a thickness each
 */
export function leastThicknesses(count: number, contextsAt: (heightsMm: readonly number[]) => readonly SlabContext[]): number[] {
  const known = remember<boolean>()
  const passes = (context: SlabContext) => known(slabKey(context), () => canPass(context))
  const raised = raise(new Array<number>(count).fill(THICKNESS.least), contextsAt, passes)
  return settleHopeless(lower(raised, contextsAt, passes), contextsAt, passes)
}

const replaced = (heights: readonly number[], at: number, height: number) => heights.map((each, i) => (i === at ? height : each))

type ContextsAt = (heightsMm: readonly number[]) => readonly SlabContext[]
type Passes = (context: SlabContext) => boolean

function raise(from: readonly number[], contextsAt: ContextsAt, passes: Passes): number[] {
  let heights = [...from]
  for (;;) {
    const contexts = contextsAt(heights)
    const next = heights.map((height, i) => (height >= THICKNESS.most || passes(contexts[i]!) ? height : height + THICKNESS.step))
    if (next.every((height, i) => height === heights[i])) return heights
    heights = next
  }
}

function lower(from: readonly number[], contextsAt: ContextsAt, passes: Passes): number[] {
  let heights = [...from]
  const wanted = contextsAt(heights).map(passes)
  for (let trial = 0; trial < TRIALS; trial += 1) {
    const before = heights
    for (const i of heights.keys()) {
      if (!wanted[i] || heights[i]! <= THICKNESS.least) continue
      const thinner = replaced(heights, i, heights[i]! - THICKNESS.step)
      if (contextsAt(thinner).every((context, j) => !wanted[j] || passes(context))) heights = thinner
    }
    if (heights === before) return heights
  }
  return heights
}

function settleHopeless(heights: readonly number[], contextsAt: ContextsAt, passes: Passes): number[] {
  return contextsAt(heights).map((context, i) => {
    if (passes(context) || !context.given) return heights[i]!
    return nearest((heightMm) => [contextsAt(replaced(heights, i, heightMm))[i]!])
  })
}
