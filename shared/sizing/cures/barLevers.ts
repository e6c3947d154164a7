import type { Bar, BarLayer, RibbedScheme, SlabLayers, SolidScheme } from '../../contracts/appraisal'
import { areaOf, type BarSet } from '../bars/barSet'
import { givenFor } from '../givenPanel'
import { layerAreaMm2 } from '../solid/bars/slabLayer'
import { CHOSEN_DIAMETERS } from '../tables/bars'
import type { CheckTarget, CureInput, Lever } from './cure'

/** Bars a rib may have side by side, and spacings of a slab's bars, mm, that are tried. Source: project rule, common practice, no source */
const MOST_IN_A_RIB = 4
const SPACINGS = [75, 100, 125, 150, 175, 200, 225, 250, 275, 300] as const

const RIB_SETS: readonly Bar[] = CHOSEN_DIAMETERS.flatMap((diameter) =>
  Array.from({ length: MOST_IN_A_RIB }, (_, i) => ({ diameter, count: i + 1 })),
)
const LAYERS: readonly BarLayer[] = CHOSEN_DIAMETERS.flatMap((diameter) => SPACINGS.map((spacing) => ({ diameter, spacing })))

const none: Lever = { trials: [], isEvery: true, limit: '' }

/** What bars should do: give more steel, less, or as much as before in another shape. */
export type BarAim = 'more' | 'less' | 'other'

/** Sets in the order they are tried: the nearest area first, on the side that is aimed at. */
function ordered<Bars>(all: readonly Bars[], areaMm2: (bars: Bars) => number, nowMm2: number, aim: BarAim): Bars[] {
  const more = all.filter((each) => areaMm2(each) > nowMm2 + 1e-6).sort((a, b) => areaMm2(a) - areaMm2(b))
  const rest = all.filter((each) => areaMm2(each) <= nowMm2 + 1e-6).sort((a, b) => areaMm2(b) - areaMm2(a))
  return aim === 'more' ? more : aim === 'less' ? rest : [...more, ...rest]
}

const setWords = (set: BarSet) => set.map(({ diameter, count }) => `${count} × ${diameter}`).join(' + ') || 'none'

/**
 * Other bars at the bottom of a panel's ribs, or at the top over its continuous edges, where they are given.
 *
 * Source: project rule, failing checks say what would cure them
 */
export function otherRibBars(
  { brief }: CureInput,
  scheme: RibbedScheme,
  target: CheckTarget,
  which: 'ribBars' | 'topBars',
  aim: BarAim,
): Lever {
  const { level, panel } = target
  const own = givenFor(scheme.givenPanels, level, panel)
  const now = own?.[which] ?? scheme[which]
  if (now === 'computed') return none
  const others = scheme.givenPanels.filter((each) => each !== own)
  const trials = ordered(RIB_SETS, (bar) => areaOf([bar]), areaOf(now), aim).map((bar) => ({
    brief,
    scheme: { ...scheme, givenPanels: [...others, { ...own, level, panel, [which]: [bar] }] },
    change: `${which === 'ribBars' ? 'bottom' : 'top'} bars ${setWords([bar])} instead of ${setWords(now)} in each rib of ${panel}`,
  }))
  return {
    trials,
    isEvery: true,
    limit: `${which === 'ribBars' ? 'bottom' : 'top'} bars up to ${MOST_IN_A_RIB} × ${CHOSEN_DIAMETERS.at(-1)}`,
  }
}

const LAYER_NAMES = {
  bottomX: 'bottom bars of the short span',
  bottomY: 'bottom bars across',
  topX: 'top bars of the short span',
  topY: 'top bars across',
}
const layerWords = (layer: BarLayer | undefined) => (layer ? `${layer.diameter} at ${layer.spacing}` : 'none')

/**
 * Another layer of bars in a solid panel, where its bars are given.
 *
 * Source: project rule, failing checks say what would cure them
 */
export function otherLayer(
  { brief }: CureInput,
  scheme: SolidScheme,
  target: CheckTarget,
  which: keyof SlabLayers,
  aim: BarAim,
): Lever {
  const { level, panel } = target
  const own = givenFor(scheme.givenPanels, level, panel)
  const now = own?.bars ?? scheme.bars
  if (now === 'computed') return none
  const others = scheme.givenPanels.filter((each) => each !== own)
  const layer = now[which]
  const trials = ordered(LAYERS, layerAreaMm2, layer ? layerAreaMm2(layer) : 0, aim).map((each) => ({
    brief,
    scheme: { ...scheme, givenPanels: [...others, { level, panel, bars: { ...now, [which]: each } }] },
    change: `${LAYER_NAMES[which]} ${layerWords(each)} instead of ${layerWords(layer)} in ${panel}`,
  }))
  return { trials, isEvery: true, limit: `${LAYER_NAMES[which]} up to ${CHOSEN_DIAMETERS.at(-1)} at ${SPACINGS[0]}` }
}
