import type { RibbedScheme, SlabLayers, SolidScheme } from '../../contracts/appraisal'
import type { Check } from '../../contracts/appraisalResult'
import { type BarAim, otherLayer, otherRibBars } from './barLevers'
import type { CheckName, CheckTarget, CureInput, Lever } from './cure'
import { largerRib, otherCover, strongerConcrete, thickerSlab, widerZone } from './sizeLevers'

const AIMS: Partial<Record<Check['name'], BarAim>> = { 'bars.fit': 'other', 'bars.spacing': 'other', 'steel.most': 'less' }

/**
 * What could change the answer of a check, in the order in which it is told: bars that were given, then sizes, then concrete. Bars,
 * thicknesses and zones that are left to the engine are not among them, since it has looked for them already.
 *
 * Source: project rule; which quantity stands in which formula
 */
export function leversOf(input: CureInput, target: CheckTarget, check: CheckName): Lever[] {
  const { scheme } = input
  const found = scheme.kind === 'ribbed' ? ribbedLevers(input, scheme, target, check) : solidLevers(input, scheme, target, check)
  return found.filter(({ trials }) => trials.length > 0)
}

function ribbedLevers(input: CureInput, scheme: RibbedScheme, target: CheckTarget, { name, place }: CheckName): Lever[] {
  const aim = AIMS[name] ?? 'more'
  const bottom = () => otherRibBars(input, scheme, target, 'ribBars', aim)
  const top = () => otherRibBars(input, scheme, target, 'topBars', aim)
  const own = () => (/\bedge/.test(place) ? top() : bottom())
  const [rib, topping] = [() => largerRib(input, scheme, 'ribWidth'), () => largerRib(input, scheme, 'topping')]
  const concrete = () => strongerConcrete(input)
  switch (name) {
    case 'flexure.midspan':
      return [bottom(), topping(), rib(), concrete()]
    case 'flexure.support':
      return [top(), widerZone(input, scheme), rib(), topping(), concrete()]
    case 'shear':
      return [widerZone(input, scheme), top(), bottom(), rib(), topping(), concrete()]
    case 'deflection':
      return [bottom(), topping(), rib(), concrete()]
    case 'bars.fit':
      return [own(), rib(), otherCover(input, false)]
    case 'steel.most':
      return [own(), rib(), topping()]
    case 'steel.least':
    case 'bars.spacing':
      return [own()]
    case 'ribs.proportions':
      return [rib()]
    case 'topping':
      return [topping()]
    case 'fire.size':
      return [place === 'rib' ? rib() : topping()]
    case 'cover.exposure':
      return [otherCover(input, true), concrete()]
    case 'fire.cover':
      return place.endsWith('side') ? [rib()] : [otherCover(input, true), rib()]
  }
}

function solidLevers(input: CureInput, scheme: SolidScheme, target: CheckTarget, { name, place }: CheckName): Lever[] {
  const aim = AIMS[name] ?? 'more'
  const layers = () => layersAt(place, name).map((which) => otherLayer(input, scheme, target, which, aim))
  const [thicker, concrete] = [() => thickerSlab(input, scheme), () => strongerConcrete(input)]
  switch (name) {
    case 'flexure.midspan':
    case 'flexure.support':
    case 'shear':
    case 'deflection':
      return [...layers(), thicker(), concrete()]
    case 'steel.most':
    case 'bars.spacing':
      return [...layers(), thicker()]
    case 'steel.least':
      return layers()
    case 'cover.exposure':
      return [otherCover(input, true), concrete()]
    case 'fire.cover':
      return [otherCover(input, true)]
    default:
      return [thicker()]
  }
}

/** Layers that a place of a slab is about: tension steel of shear lies at the top where the floor goes on, else at the bottom. */
function layersAt(place: string, name: Check['name']): (keyof SlabLayers)[] {
  const isShort = place.startsWith('short')
  if (!place.includes('edge')) return [isShort ? 'bottomX' : 'bottomY']
  const [top, bottom] = isShort ? (['topX', 'bottomX'] as const) : (['topY', 'bottomY'] as const)
  return name === 'shear' ? [top, bottom] : [top]
}
