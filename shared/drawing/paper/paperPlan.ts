import type { PlanMargins } from '../planScale'
import { largestScale } from './drawingScale'
import type { PaperName } from './paperSize'
import { PAPER_SIZES, PX_PER_PAPER_MM } from './paperSize'

/** How a plan lies on a sheet of paper with its legend, particulars and title block. */
export interface PaperPlan {
  readonly paper: PaperName
  readonly isLandscape: boolean
  /** Where legend, particulars and title block stand. */
  readonly words: 'beside' | 'below'
  readonly pageMm: readonly [number, number]
  /** 1 to so many. */
  readonly reduction: number
  /** Of the drawing, so that it is printed at that scale, px for 1 mm of the building. */
  readonly pxPerMm: number
}

/** What is drawn: its extent in the building, mm, and the room that dimensions need around it, px. */
export interface PaperSubject {
  readonly lengthsMm: readonly [number, number]
  readonly margins: PlanMargins
  /** Below the drawing, px. */
  readonly footPx: number
}

/** Blank border of a sheet, mm; at the left edge it is filed by. Source: ISO 5457:1999, borders and frame (from memory) */
export const PAPER_BORDER_MM = { filed: 20, other: 10 } as const

/** Room for legend, particulars and title block: width beside the plan, height below it, mm. */
export const WORDS_MM = { beside: 70, below: 62 } as const

/** Clear room around the plan inside the frame, mm. */
const CLEAR_MM = 3

/** Which way the paper lies; `either`: as the larger scale asks. */
export type PaperTurn = 'either' | 'landscape' | 'portrait'

type Placing = Pick<PaperPlan, 'isLandscape' | 'words'>
/** In order of preference where the scale is the same. */
const PLACINGS: readonly Placing[] = [
  { isLandscape: true, words: 'beside' },
  { isLandscape: true, words: 'below' },
  { isLandscape: false, words: 'below' },
  { isLandscape: false, words: 'beside' },
]

/**
 * The largest scale at which a plan lies on a sheet of paper, the words placed as best for it, and the paper turned so too
 * unless `turn` says how it lies.
 *
 * Source: project rule; scales ISO 5455, paper ISO 216
 * @throws RangeError for a floor of more than fifty thousand times the paper
 */
export function paperPlan(subject: PaperSubject, paper: PaperName, turn: PaperTurn = 'either'): PaperPlan {
  const allowed = PLACINGS.filter(({ isLandscape }) => turn === 'either' || isLandscape === (turn === 'landscape'))
  const placed = allowed.flatMap((placing) => {
    const reduction = reductionFor(subject, roomMm(paper, placing))
    return reduction === null ? [] : [{ ...placing, reduction }]
  })
  const best = placed.reduce<(typeof placed)[number] | null>(
    (found, each) => (found === null || each.reduction < found.reduction ? each : found),
    null,
  )
  if (best === null) throw new RangeError(`expected a floor that fits ${paper} at 1 : 50 000 or larger`)
  const { longMm, shortMm } = PAPER_SIZES[paper]
  return {
    paper,
    ...best,
    pageMm: best.isLandscape ? [longMm, shortMm] : [shortMm, longMm],
    pxPerMm: PX_PER_PAPER_MM / best.reduction,
  }
}

/** Room for the plan on the paper, mm. */
function roomMm(paper: PaperName, { isLandscape, words }: Placing): readonly [number, number] {
  const { longMm, shortMm } = PAPER_SIZES[paper]
  const [width, height] = isLandscape ? [longMm, shortMm] : [shortMm, longMm]
  const inside = [
    width - PAPER_BORDER_MM.filed - PAPER_BORDER_MM.other - 2 * CLEAR_MM,
    height - 2 * PAPER_BORDER_MM.other - 2 * CLEAR_MM,
  ] as const
  return words === 'beside' ? [inside[0] - WORDS_MM.beside, inside[1]] : [inside[0], inside[1] - WORDS_MM.below]
}

function reductionFor({ lengthsMm, margins, footPx }: PaperSubject, [widthMm, heightMm]: readonly [number, number]) {
  const widthPx = widthMm * PX_PER_PAPER_MM - margins.left - margins.right
  const heightPx = heightMm * PX_PER_PAPER_MM - margins.top - margins.bottom - footPx
  return largestScale(
    (reduction) =>
      (lengthsMm[0] / reduction) * PX_PER_PAPER_MM <= widthPx && (lengthsMm[1] / reduction) * PX_PER_PAPER_MM <= heightPx,
  )
}
