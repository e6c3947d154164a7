import type { Brief } from '#shared/contracts/appraisal'
import { nationalValuesText } from '#shared/sizing/nationalValuesText'
import { dayText, figureText, listText } from '../figureText'
import type { FrozenComparison } from '../frozenComparison'
import { itemText } from './itemText'
import { markupWords } from './markupWords'
import type { ReportFact } from './reportFact'

/** Conditions of exposure that are no class of their own name. */
const EXPOSURE_WORDS: Readonly<Record<string, string>> = { verySevere: 'very severe', mostSevere: 'most severe' }

function basisText(brief: Brief): string {
  const values = nationalValuesText(brief)
  if (brief.basis === 'EN1992') return `EN 1992-1-1 and EN 1992-1-2 with ${values}.`
  return `BS 8110-1:1997 with ${values}; withdrawn in 2010 and used here because local practice still does.`
}

function strengthText(brief: Brief): string {
  const [concrete, steel] =
    brief.basis === 'EN1992' ? [`fck ${brief.fck} MPa`, `fyk ${brief.fyk} MPa`] : [`fcu ${brief.fcu} MPa`, `fy ${brief.fy} MPa`]
  return `Concrete ${concrete}, steel ${steel}.`
}

function loadText(brief: Brief): string {
  const loads: [string, number][] = [
    ['imposed', brief.imposedLoad],
    ['partitions', brief.partitionsLoad],
    ['finishes', brief.finishesLoad],
    ['services', brief.servicesLoad],
  ]
  const words = loads.filter(([, load]) => load > 0).map(([name, load]) => `${name} ${figureText(load, 2)}`)
  return words.length === 0 ? 'None beside the own weight.' : `${listText(words)} kN/m², beside the own weight.`
}

function fireText({ fireMinutes, cover, exposure }: Brief): string {
  const period = fireMinutes === 0 ? 'No fire period' : `${fireMinutes} minutes of fire`
  const exposed = exposure === undefined ? '' : `, checked for exposure ${EXPOSURE_WORDS[exposure] ?? exposure}`
  return `${period}; ${figureText(cover, 0)} mm of cover to the outermost bar${exposed}.`
}

function ribbedText({ ribbed: { specification, name } }: FrozenComparison): string {
  const { mark, block, ribWidth, topping, mesh } = specification
  const blocks = `hollow blocks ${block.length} long, ${block.width} wide and ${block.height} high, ${figureText(block.mass, 1)} kg each`
  const meshWords = mesh === 'none' ? 'without mesh' : `with mesh ${mesh}`
  return `${mark}, ${name}: ${blocks}; ribs ${ribWidth} wide; topping ${topping} ${meshWords}. Sizes in mm.`
}

function solidText({ solid: { specification, depth, name } }: FrozenComparison): string {
  const how = specification.thickness === 'least' ? 'the least thickness that passes its checks' : 'as given'
  return `${specification.mark}, ${name}: ${figureText(depth, 0)} mm thick, ${how}.`
}

function areaText({ floor }: FrozenComparison): string {
  const floors = floor.floorCount === 1 ? 'one floor' : `${floor.floorCount} floors`
  return `${figureText(floor.areaM2, 1)} m² on ${floors}, ${floor.panelCount} panels in all, measured to the centre-lines of the supports. Costs and weights per m² are on this area.`
}

function markupText({ markups, edition }: FrozenComparison): string {
  const included =
    markups.length === 0
      ? 'No preliminaries, contingency or tax are in the costs.'
      : `In both totals: ${listText(markupWords(markups))}.`
  return edition.taxBasis === '' ? included : `${included} Tax basis of the rates: ${edition.taxBasis.replace(/\.$/, '')}.`
}

/** By which rules the quantities are measured; nothing for what was sent before they were kept. */
function measuredFacts({ measuredBy }: FrozenComparison): ReportFact[] {
  return measuredBy === undefined ? [] : [{ title: 'Measured by', text: `${measuredBy.name}: ${measuredBy.source}.` }]
}

/** What the project prices otherwise than its edition, and why. */
function overrideFacts({ overrides }: FrozenComparison): ReportFact[] {
  if (overrides === undefined || overrides.length === 0) return []
  const each = overrides.map(
    ({ item, reason, author, changedAt }) =>
      `${itemText(item)}, ${reason.replace(/\.$/, '')} (${author}, ${dayText(changedAt.slice(0, 10))})`,
  )
  const text = each.join('; ')
  return [{ title: 'Rates of this project’s own', text: `${text.charAt(0).toUpperCase()}${text.slice(1)}.` }]
}

function momentFacts({ redistribution }: Brief): ReportFact[] {
  if (redistribution === 0) return []
  const share = figureText(redistribution, 0)
  return [{ title: 'Moments', text: `${share} % of elastic support moments are moved to the spans where the code allows it.` }]
}

/** What the figures rest on, so that they can be questioned. */
export function basisFacts(frozen: FrozenComparison): ReportFact[] {
  const { brief, edition } = frozen
  return [
    { title: 'Sized by', text: basisText(brief) },
    { title: 'Loads', text: loadText(brief) },
    { title: 'Strengths', text: strengthText(brief) },
    ...momentFacts(brief),
    { title: 'Fire and cover', text: fireText(brief) },
    { title: 'Ribbed', text: ribbedText(frozen) },
    { title: 'Solid', text: solidText(frozen) },
    { title: 'Area', text: areaText(frozen) },
    ...measuredFacts(frozen),
    {
      title: 'Rates',
      text: `${edition.region}, edition ${edition.number}, prices of ${dayText(edition.baseDate)}, ${edition.currency}. This report keeps them whatever the book says later.`,
    },
    ...overrideFacts(frozen),
    { title: 'Markups', text: markupText(frozen) },
  ]
}
