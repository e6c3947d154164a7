import type { BarDiameter } from '../contracts/appraisal'
import { type BarSet, centroidMm, setText } from '../sizing/bars/barSet'
import { figure } from '../sizing/figure'
import { endName } from '../sizing/ribbed/ribContext'
import { designRibs, type RibTask } from '../sizing/ribbed/ribDesign'
import { effectiveDepthMm } from '../sizing/ribbed/ribSection'
import { chooseSlabBars } from '../sizing/solid/bars/chooseSlabBars'
import { layerText } from '../sizing/solid/bars/slabLayer'
import { layerDepthMm, type SlabContext } from '../sizing/solid/slabContext'
import type { CalculationEntry } from './calculation'
import { reckoned, worked } from './line'

const CLAUSE = 'cover to the outermost bar'

/** Effective depths of the bottom bars of a solid panel, mm; top bars lie the same from their face. */
export function solidDepthEntries(context: SlabContext): CalculationEntry[] {
  const { short, long } = chooseSlabBars(context).bottom
  const [first, second] = [short.middle, long.middle]
  const { heightMm, brief } = context
  const of = (heading: string, diameter: BarDiameter, outer: BarDiameter | null) => {
    const [h, c] = [figure(heightMm), figure(brief.cover)]
    const formula = outer ? 'h − c − φx − φy/2' : 'h − c − φx/2'
    const numbers = outer ? `${h} − ${c} − ${outer} − ${diameter}/2` : `${h} − ${c} − ${diameter}/2`
    return worked(
      heading,
      CLAUSE,
      reckoned(outer ? 'dy' : 'dx', formula, numbers, layerDepthMm(context, diameter, outer), 'mm', 1),
    )
  }
  return [
    of(`Depth of bottom bars, short span, ${layerText(first)}`, first.diameter, null),
    of(`Depth of bottom bars across, ${layerText(second)}`, second.diameter, first.diameter),
  ]
}

/** Effective depths of a rib's bars, mm. */
export function ribbedDepthEntries(task: RibTask): CalculationEntry[] {
  const { bottom, tops } = designRibs(task)
  const { context } = task
  const { section } = context
  const of = (heading: string, bars: BarSet) => {
    const numbers = `${figure(section.heightMm)} − ${figure(section.coverMm)} − ${section.linkMm} − ${figure(centroidMm(bars), 2)}`
    return worked(
      `${heading}, ${setText(bars)}`,
      CLAUSE,
      reckoned('d', 'h − c − link − φ/2', numbers, effectiveDepthMm(section, bars), 'mm', 1),
    )
  }
  const ends = (['start', 'end'] as const).filter((end) => context.ends[end].isContinuous && tops[end].length > 0)
  return [of('Depth of bottom bars', bottom), ...ends.map((end) => of(`Depth of top bars, ${endName(context, end)}`, tops[end]))]
}
