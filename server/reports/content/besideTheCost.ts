import { figureText } from '../figureText'
import type { FrozenComparison, FrozenScheme } from '../frozenComparison'
import { otherKind, type SchemeKind } from './headline'
import type { ReportFact } from './reportFact'
import { soundByMassDb } from './soundByMass'

/** A fact for which one of the floors is the better, whatever the cost says. */
interface FavouringFact extends ReportFact {
  readonly favours: SchemeKind
}

/** By mass over the floor's own area; for what was sent before that was compared, by the dead load. */
function soundOf({ ribbed, solid, alsoCompared }: FrozenComparison): readonly [number | null, number | null] {
  const row = alsoCompared?.find(({ key }) => key === 'soundAir')
  return row ? [row.ribbed, row.solid] : [soundByMassDb(ribbed.deadLoad.perArea), soundByMassDb(solid.deadLoad.perArea)]
}

function soundFacts(frozen: FrozenComparison): FavouringFact[] {
  const [ofRibbed, ofSolid] = soundOf(frozen)
  if (ofRibbed === null || ofSolid === null) return []
  const difference = Math.round(ofSolid) - Math.round(ofRibbed)
  if (difference === 0) return []
  const favours = difference > 0 ? 'solid' : 'ribbed'
  const figures = `${figureText(ofRibbed, 0)} dB ribbed, ${figureText(ofSolid, 0)} dB solid; EN 12354-1, annex B, for screening`
  const doubt = 'The hollows may take some of it away; a floor covering decides what is heard of footsteps.'
  const text = `By its mass alone ${favours} stops ${Math.abs(difference)} dB more of what is heard through air (${figures}). ${doubt}`
  return [{ title: 'Sound', favours, text }]
}

function fireOf({ checks }: FrozenScheme): { used: number; isPassed: boolean } | null {
  const fire = checks.filter(({ name }) => name === 'fire.size' || name === 'fire.cover')
  if (fire.length === 0) return null
  return { used: Math.max(...fire.map(({ utilisation }) => utilisation)), isPassed: fire.every(({ pass }) => pass) }
}

function fireFacts({ brief, ribbed, solid }: FrozenComparison): FavouringFact[] {
  const [first, second] = [fireOf(ribbed), fireOf(solid)]
  if (brief.fireMinutes === 0 || first === null || second === null || first.used === second.used) return []
  const favours = first.used < second.used ? 'ribbed' : 'solid'
  const words = (name: string, { used, isPassed }: { used: number; isPassed: boolean }) =>
    `${name} ${isPassed ? 'passes' : 'fails'} with ${figureText(used, 2)} of what the tables allow`
  const hollow = favours === 'solid' ? ' A thin topping and narrow ribs run out first.' : ''
  const text = `For ${brief.fireMinutes} minutes ${words('ribbed', first)}, ${words('solid', second)}.${hollow} Blocks and plaster count only where a test says so.`
  return [{ title: 'Fire', favours, text }]
}

function heightFacts({ ribbed, solid, floor }: FrozenComparison): FavouringFact[] {
  const deeper = ribbed.depth - solid.depth
  if (deeper === 0) return []
  const favours = deeper > 0 ? 'solid' : 'ribbed'
  const lost = Math.abs(deeper)
  const other = otherKind(favours)
  const every = `${other.charAt(0).toUpperCase()}${other.slice(1)} is ${figureText(lost, 0)} mm deeper on every floor`
  const all = floor.floorCount > 1 ? `, ${figureText(lost * floor.floorCount, 0)} mm over ${floor.floorCount} floors` : ''
  return [{ title: 'Height', favours, text: `${every}${all}. Stairs, cladding and pipes grow with it; that is not in the cost.` }]
}

/**
 * How the two floors are built, whatever their sizes.
 *
 * Source: common practice, no source
 */
const BUILT_SOLID: readonly FavouringFact[] = [
  {
    title: 'Holes',
    favours: 'solid',
    text: 'Pipes pass through a ribbed floor between its ribs only, and no rib is ever cut for them. A solid floor leaves more freedom, within what the engineer allows.',
  },
  {
    title: 'Heavy things',
    favours: 'solid',
    text: 'A wall or a machine that stands along a rib wants doubled ribs, on hollow blocks a spread under it. Neither is in the cost.',
  },
  {
    title: 'Water',
    favours: 'solid',
    text: 'Over blocks the topping is thin. Wet rooms want a membrane on either floor; a floor that must hold water is better solid.',
  },
]

/** Where a scheme is the better floor beside the cost: what is computed says how, the rest is how the two are built. */
export function besideTheCost(frozen: FrozenComparison, kind: SchemeKind): ReportFact[] {
  return [...soundFacts(frozen), ...fireFacts(frozen), ...BUILT_SOLID, ...heightFacts(frozen)]
    .filter(({ favours }) => favours === kind)
    .map(({ title, text }) => ({ title, text }))
}
