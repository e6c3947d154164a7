import type { Bar, BarLayer, Scheme, SolidScheme } from '../contracts/appraisal'
import type { BarRun, SizedPanel } from '../sizing/sizedPanel'

/** Bars as a cross-section at midspan shows them; what is not known yet is empty and is not drawn. */
export interface SectionReinforcement {
  /** To the outermost bar or link, mm. */
  readonly coverMm: number
  /** Bottom bars of one rib, cut by the section. */
  readonly ribBars: readonly Bar[]
  /** Lowest layer of a solid floor, cut by the section. */
  readonly cutLayer: BarLayer | null
  /** Layer above it, lying in the section. */
  readonly lyingLayer: BarLayer | null
}

/** Nothing known but the cover. */
export function unknownReinforcement(coverMm: number): SectionReinforcement {
  return { coverMm, ribBars: [], cutLayer: null, lyingLayer: null }
}

/**
 * Bottom bars at midspan: as the scheme gives them, else as `panel` was sized; unknown where neither says.
 * @param panel - the panel cut; null before it is sized
 */
export function sectionReinforcement(scheme: Scheme, coverMm: number, panel: SizedPanel | null): SectionReinforcement {
  const unknown = unknownReinforcement(coverMm)
  if (scheme.kind === 'ribbed') {
    if (scheme.ribBars !== 'computed') return { ...unknown, ribBars: scheme.ribBars }
    return panel === null ? unknown : { ...unknown, ribBars: sizedRibBars(panel) }
  }
  if (scheme.bars !== 'computed') return { ...unknown, ...givenLayers(scheme.bars) }
  return panel === null ? unknown : { ...unknown, ...sizedLayers(panel) }
}

function givenLayers({ bottomX, bottomY }: Exclude<SolidScheme['bars'], 'computed'>) {
  return { cutLayer: bottomX, lyingLayer: bottomY }
}

const area = (diameter: number) => (Math.PI * diameter ** 2) / 4
const bottomRuns = ({ bars }: SizedPanel): BarRun[] => bars.filter(({ position }) => position.startsWith('bottom'))

/** Bars of one rib: the panel's bottom bars shared out so that they make the steel provided in one rib. */
function sizedRibBars(panel: SizedPanel): Bar[] {
  const counts = new Map<BarRun['diameter'], number>()
  for (const { diameter, count } of bottomRuns(panel)) counts.set(diameter, (counts.get(diameter) ?? 0) + count)
  const total = [...counts].reduce((sum, [diameter, count]) => sum + count * area(diameter), 0)
  if (total === 0) return []
  const ribs = total / panel.steel.midspanProvided
  return [...counts].map(([diameter, count]) => ({ diameter, count: Math.max(1, Math.round(count / ribs)) }))
}

/** The short span's bars lie lowest; the other direction's are the first whose position says so. */
function sizedLayers(panel: SizedPanel): Pick<SectionReinforcement, 'cutLayer' | 'lyingLayer'> {
  const [main, ...others] = bottomRuns(panel)
  if (main === undefined || panel.steel.midspanProvided === 0) return { cutLayer: null, lyingLayer: null }
  const spacing = Math.round((area(main.diameter) * 1000) / panel.steel.midspanProvided)
  const across = others.find(({ position }) => !position.startsWith('bottom, short span'))
  return { cutLayer: { diameter: main.diameter, spacing }, lyingLayer: across ? layerOf(across) : null }
}

/** The layer that a run of bars belongs to; null where it is counted in ribs. */
function layerOf({ diameter, spacingMm }: BarRun): BarLayer | null {
  return spacingMm === null ? null : { diameter, spacing: spacingMm }
}
