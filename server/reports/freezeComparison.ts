import type { AlsoCompared } from '#shared/alsoCompared/alsoCompared'
import type { PanelCalculation } from '#shared/calculation/calculation'
import type { ScopeDifference } from '#shared/alsoCompared/scopeDifferences'
import type { AppraisalFile, RibbedScheme, SolidScheme } from '#shared/contracts/appraisal'
import type { Appraisal, SchemeResult } from '#shared/contracts/appraisalResult'
import type { CatalogueBlock } from '#shared/contracts/blockCatalogue'
import type { Project, StoredScheme } from '#shared/contracts/project'
import type { Edition } from '#shared/contracts/rateBook'
import type { RateOverride } from '#shared/contracts/rateOverride'
import { itemisedCost } from '#shared/pricing/itemisedCost'
import { comparisonSections } from '#shared/drawing/comparisonSections'
import type { SectionSubject } from '#shared/drawing/sectionBody'
import { sectionReinforcement } from '#shared/drawing/sectionReinforcement'
import type { SizedPanel } from '#shared/sizing/sizedPanel'
import { itemisedQuantities } from '#shared/takeoff/itemisedQuantities'
import { RULE_SETS } from '#shared/takeoff/ruleSets'
import { differenceGroups } from './content/differenceGroups'
import { chargedMarkups } from './content/markupWords'
import { tightestChecks } from './content/tightestChecks'
import { freezeAlsoRows, freezeScope } from './freezeBeside'
import type { FrozenComparison } from './frozenComparison'

/** Two schemes of a project, appraised and fully priced: the first scheme of the file is ribbed, the second solid. */
export interface ComparedProject {
  readonly project: Project
  readonly schemes: readonly [StoredScheme, StoredScheme]
  readonly blockMaterial: CatalogueBlock['material'] | undefined
  readonly edition: Edition
  readonly overrides: readonly RateOverride[]
  readonly file: AppraisalFile
  readonly appraisal: Appraisal
  /** The panel of each scheme that its cross-section shows. */
  readonly cutPanels: readonly (SizedPanel | null)[]
  /** Beside `appraisal.schemes`. */
  readonly alsoCompared: readonly AlsoCompared[]
  readonly scopeDifferences: readonly ScopeDifference[]
  /** Of the tightest panel of each scheme. */
  readonly calculations: readonly PanelCalculation[]
}

/** Who sends it to whom. */
export type Sending = Pick<FrozenComparison, 'firm' | 'recipient' | 'preparedBy' | 'note'>

const WIDE_PX = 788
const NARROW_PX = 328

function frozenScheme(row: StoredScheme, { depth, passes, checks, deadLoad, quantities, cost }: SchemeResult) {
  if (cost === null) throw new RangeError(`expected a price of scheme ${row.specification.mark}`)
  return {
    name: row.name,
    depth,
    passes,
    checkCount: checks.length,
    failedCount: checks.filter(({ pass }) => !pass).length,
    checks: tightestChecks(checks),
    deadLoad,
    quantities: itemisedQuantities(quantities)
      .filter(({ net }) => net !== 0)
      .map(({ item, unit, net }) => ({ item, unit, net })),
    total: cost.total,
    perArea: cost.perArea,
  }
}

function sections({ schemes, file, appraisal, cutPanels, blockMaterial }: ComparedProject): FrozenComparison['sections'] {
  const subject = (index: 0 | 1): SectionSubject => {
    const { specification } = schemes[index]
    return {
      scheme: specification,
      depthMm: appraisal.schemes[index]!.depth,
      reinforcement: sectionReinforcement(specification, file.brief.cover, cutPanels[index] ?? null),
      ...(blockMaterial === undefined ? {} : { blockMaterial }),
    }
  }
  const pair = { ribbed: subject(0), solid: subject(1) }
  return {
    wide: comparisonSections(pair, { id: 'wide', widthPx: WIDE_PX }),
    narrow: comparisonSections(pair, { id: 'narrow', widthPx: NARROW_PX }),
  }
}

/** Gross area, number of floors and number of panels, repeats in. */
function floorOf({ levels }: AppraisalFile, { panels }: SchemeResult): FrozenComparison['floor'] {
  const repeatsOf = (levelMark: string, panelMark: string): number => {
    const level = levels.find(({ mark }) => mark === levelMark)
    return (level?.repeat ?? 0) * (level?.panels.find(({ mark }) => mark === panelMark)?.repeat ?? 0)
  }
  const repeated = panels.map(({ level, mark, grossArea }) => ({ repeats: repeatsOf(level, mark), grossArea }))
  return {
    areaM2: repeated.reduce((sum, { repeats, grossArea }) => sum + repeats * grossArea, 0),
    floorCount: levels.reduce((sum, { repeat }) => sum + repeat, 0),
    panelCount: repeated.reduce((sum, { repeats }) => sum + repeats, 0),
  }
}

function measuredBy({ measurement }: AppraisalFile): FrozenComparison['measuredBy'] {
  const { name, source } = RULE_SETS[measurement]
  return { name, source }
}

/** Items of either bill that the project prices otherwise. */
function overriddenIn({ overrides, appraisal }: ComparedProject): Pick<FrozenComparison, 'overrides'> {
  const billed = new Set(appraisal.schemes.flatMap(({ cost }) => (cost ? itemisedCost(cost).lines.map(({ item }) => item) : [])))
  const used = overrides.filter(({ item }) => billed.has(item))
  if (used.length === 0) return {}
  return { overrides: used.map(({ item, reason, author, changedAt }) => ({ item, reason, author, changedAt })) }
}

/**
 * All that the report needs, taken out of an appraisal once and for good: what is in it never changes with the project, the
 * rates or the engine. It holds no rate, and amounts of groups only.
 * @throws RangeError when a scheme is not priced
 */
export function freezeComparison(compared: ComparedProject, sending: Sending, frozenAt: string): FrozenComparison {
  const { project, schemes, edition, file, appraisal } = compared
  const [ribbed, solid] = appraisal.schemes
  if (!ribbed?.cost || !solid?.cost) throw new RangeError('expected two priced schemes')
  const { id, name, reference, place, use } = project
  return {
    format: 'bothways.comparison/1',
    frozenAt,
    ...sending,
    project: { id, name, reference, place, use },
    brief: file.brief,
    edition: {
      region: edition.region,
      number: edition.number,
      currency: edition.currency,
      baseDate: edition.baseDate,
      taxBasis: edition.taxBasis,
    },
    floor: floorOf(file, ribbed),
    ribbed: { ...frozenScheme(schemes[0], ribbed), specification: schemes[0].specification as RibbedScheme },
    solid: { ...frozenScheme(schemes[1], solid), specification: schemes[1].specification as SolidScheme },
    groups: differenceGroups(itemisedCost(ribbed.cost), itemisedCost(solid.cost)),
    markups: chargedMarkups(ribbed.cost),
    sections: sections(compared),
    alsoCompared: freezeAlsoRows(compared.alsoCompared[0]!, compared.alsoCompared[1]!),
    scope: freezeScope(file.scope, compared.scopeDifferences, { ribbed: ribbed.mark, solid: solid.mark }),
    measuredBy: measuredBy(file),
    ...overriddenIn(compared),
    calculations: [...compared.calculations],
  }
}
