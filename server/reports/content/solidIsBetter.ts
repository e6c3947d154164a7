import { figureText } from '../figureText'
import type { FrozenComparison, FrozenScheme } from '../frozenComparison'
import type { ReportFact } from './reportFact'
import { soundByMassDb } from './soundByMass'

function soundFact({ ribbed, solid }: FrozenComparison): ReportFact {
  const [ofRibbed, ofSolid] = [soundByMassDb(ribbed.deadLoad.perArea), soundByMassDb(solid.deadLoad.perArea)]
  const doubt = 'The hollows may take more; a floor covering decides what is heard of footsteps.'
  if (ofRibbed === null || ofSolid === null) {
    const text = `One of the floors is too light or too heavy for the formula of mass (150 to 600 kg/m²), so no figure is given. ${doubt}`
    return { title: 'Sound', text }
  }
  const difference = Math.round(ofSolid) - Math.round(ofRibbed)
  const words =
    difference > 0
      ? `By its mass alone solid stops ${difference} dB more of what is heard through air`
      : difference < 0
        ? `By its mass alone ribbed stops ${-difference} dB more of what is heard through air, here the heavier floor`
        : 'By mass alone both stop the same of what is heard through air'
  const figures = `${figureText(ofRibbed, 0)} dB ribbed, ${figureText(ofSolid, 0)} dB solid; EN 12354-1, annex B, for screening`
  return { title: 'Sound', text: `${words} (${figures}). ${doubt}` }
}

function tightestFire({ checks }: FrozenScheme): number | null {
  const fire = checks.filter(({ name }) => name === 'fire.size' || name === 'fire.cover')
  return fire.length === 0 ? null : Math.max(...fire.map(({ utilisation }) => utilisation))
}

function fireWords(name: string, scheme: FrozenScheme): string {
  const tightest = tightestFire(scheme)
  if (tightest === null) return `${name} was not checked for fire`
  const fails = scheme.checks.some(({ name: check, pass }) => check.startsWith('fire.') && !pass)
  return `${name} ${fails ? 'fails' : 'passes'} the tables (${figureText(tightest, 2)} of what is allowed)`
}

function fireFact({ brief, ribbed, solid }: FrozenComparison): ReportFact {
  const tested = 'Blocks and plaster count towards fire only where a test says so.'
  if (brief.fireMinutes === 0) return { title: 'Fire', text: `No fire period was asked for, so none was checked. ${tested}` }
  const words = `For ${brief.fireMinutes} minutes ${fireWords('ribbed', ribbed)}, ${fireWords('solid', solid)}`
  return { title: 'Fire', text: `${words}. A thin topping and narrow ribs run out first. ${tested}` }
}

function depthFacts({ ribbed, solid, floor }: FrozenComparison): ReportFact[] {
  const deeper = ribbed.depth - solid.depth
  if (deeper <= 0) return []
  const every = `Ribbed is ${figureText(deeper, 0)} mm deeper on every floor`
  const all = floor.floorCount > 1 ? `, ${figureText(deeper * floor.floorCount, 0)} mm over ${floor.floorCount} floors` : ''
  return [{ title: 'Height', text: `${every}${all}. Stairs, cladding and pipes grow with it; that is not in the cost.` }]
}

/**
 * Where the solid floor is the better one whatever the cost says. What is computed says how; the rest are facts of how the two
 * floors are built.
 *
 * Source: common practice, no source, for holes, heavy things and water
 */
export function solidIsBetter(frozen: FrozenComparison): ReportFact[] {
  return [
    soundFact(frozen),
    fireFact(frozen),
    {
      title: 'Holes',
      text: 'Pipes pass through a ribbed floor between its ribs only, and no rib is ever cut for them. A solid floor leaves more freedom, within what the engineer allows.',
    },
    {
      title: 'Heavy things',
      text: 'A wall or a machine that stands along a rib wants doubled ribs, on hollow blocks a spread under it. Neither is in the cost.',
    },
    {
      title: 'Water',
      text: 'Over blocks the topping is thin. Wet rooms want a membrane on either floor; a floor that must hold water is better solid.',
    },
    ...depthFacts(frozen),
  ]
}
