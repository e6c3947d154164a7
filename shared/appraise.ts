import { alsoCompared, type AlsoCompared } from './alsoCompared/alsoCompared'
import { gangWeeks } from './alsoCompared/labourFigures'
import { allScopeDifferences, type ScopeDifference } from './alsoCompared/scopeDifferences'
import { AppraisalRefusedError } from './appraisalRefused'
import { compareSchemes } from './comparison/compareSchemes'
import type { ApiIssue } from './contracts/apiError'
import type { AppraisalFile, Scheme } from './contracts/appraisal'
import type { Appraisal, PanelResult, SchemeResult } from './contracts/appraisalResult'
import { checkFloor } from './layout/checkFloor'
import { OutOfScopeError } from './outOfScope'
import { priceScheme } from './pricing/priceScheme'
import { ratesOfScheme } from './pricing/ratesOfScheme'
import { scopeLines } from './pricing/scopeLines'
import { toQuantity } from './pricing/toQuantity'
import type { SizedPanel, SizedScheme } from './sizing/sizedPanel'
import { sizeScheme } from './sizing/sizeScheme'
import { deadLoadOf, grossAreaM2 } from './takeoff/deadLoad'
import { toM2 } from './units'
import { measuredPanels } from './takeoff/measuredPanel'
import { RULE_SETS } from './takeoff/ruleSets'
import { comparingRules } from './takeoff/rules/comparingRules'
import { schemeMeasures, type SchemeMeasures } from './takeoff/schemeMeasures'
import { takeOffScheme } from './takeoff/takeOffScheme'

/** Weeks are priced as printed. */
const WEEK_DECIMALS = 2

/** A scheme that lies outside what the rules cover, and why: it has no result, the other schemes have. */
export interface SchemeProblem {
  readonly scheme: string
  readonly issue: ApiIssue
}

/** An appraisal with the sized panels it rests on, from which plans and sections are drawn. */
export interface FullAppraisal {
  readonly appraisal: Appraisal
  /** Beside `appraisal.schemes`, in the same order. */
  readonly sized: readonly SizedScheme[]
  /** What is compared beside the cost, beside `appraisal.schemes`, in the same order. */
  readonly alsoCompared: readonly AlsoCompared[]
  /** Where ribbed and solid schemes differ in what their totals hold, or do not say; each pair of them. */
  readonly scopeDifferences: readonly ScopeDifference[]
  /** Schemes left out of both. */
  readonly problems: readonly SchemeProblem[]
}

/**
 * The same floor built every way the file asks for: sized, measured, priced where it has rates, and compared.
 *
 * @throws AppraisalRefusedError when the floor cannot be: outlines that cross or overlap, voids outside, blocks that do not fit
 * @throws OutOfScopeError when a scheme lies outside what its rules cover
 */
export function appraise(file: AppraisalFile): Appraisal {
  refuseImpossibleFloor(file)
  const schemes = file.schemes.map((scheme) => appraiseScheme(scheme, file).result)
  return appraisalOf(schemes, file)
}

/**
 * As `appraise`, for screens: a scheme outside the scope of its rules becomes a problem and does not stop the others.
 *
 * @throws AppraisalRefusedError as `appraise` does
 */
export function appraiseInFull(file: AppraisalFile): FullAppraisal {
  refuseImpossibleFloor(file)
  const outcomes = file.schemes.map((scheme) => attempt(scheme, file))
  const done = outcomes.filter((outcome) => 'result' in outcome)
  return {
    appraisal: appraisalOf(
      done.map(({ result }) => result),
      file,
    ),
    sized: done.map(({ sized }) => sized),
    alsoCompared: done.map(({ result: { mark, kind, deadLoad }, sized: { panels }, measures }) =>
      alsoCompared({ mark, kind, deadLoad, panels, measures }, file),
    ),
    scopeDifferences: allScopeDifferences(
      file.scope,
      done.map(({ result }) => result),
    ),
    problems: outcomes.filter((outcome) => 'issue' in outcome),
  }
}

function refuseImpossibleFloor(file: AppraisalFile): void {
  const issues = checkFloor(file)
  if (issues.length > 0) throw new AppraisalRefusedError(issues)
}

/** The first ribbed and the first solid scheme of the file are compared; nothing where one of them has no result. */
function appraisalOf(schemes: SchemeResult[], file: AppraisalFile): Appraisal {
  const firstOf = (kind: Scheme['kind']) => {
    const mark = file.schemes.find((scheme) => scheme.kind === kind)?.mark
    return schemes.find((scheme) => scheme.mark === mark)
  }
  const [ribbed, solid] = [firstOf('ribbed'), firstOf('solid')]
  return { format: 'bothways.appraisal-result/1', schemes, comparison: ribbed && solid ? compareSchemes(ribbed, solid) : null }
}

/** A scheme's result, and what it rests on. */
interface AppraisedScheme {
  readonly result: SchemeResult
  readonly sized: SizedScheme
  readonly measures: SchemeMeasures
}

function attempt(scheme: Scheme, file: AppraisalFile): AppraisedScheme | SchemeProblem {
  try {
    return appraiseScheme(scheme, file)
  } catch (error) {
    if (!(error instanceof OutOfScopeError)) throw error
    return { scheme: scheme.mark, issue: { path: error.path, message: error.expected } }
  }
}

function appraiseScheme(scheme: Scheme, file: AppraisalFile): AppraisedScheme {
  const { brief, levels, rates, scope } = file
  const sized = sizeScheme(scheme, { brief, levels })
  const rules = RULE_SETS[file.measurement]
  const quantities = takeOffScheme(scheme, sized, levels, rules, brief.basis)
  const panels = measuredPanels(sized, levels)
  const measures = schemeMeasures(panels, scheme, levels)
  const declared = rates ? scopeLines(scope, scheme.mark, measures, rates.currency) : []
  const isByWeek = rates !== undefined && /[1-9]/.test(rates.markups.preliminariesPerWeek)
  const weeks = isByWeek ? toQuantity(gangWeeks(measures, file.factors.labour), WEEK_DECIMALS) : undefined
  const result: SchemeResult = {
    mark: scheme.mark,
    kind: scheme.kind,
    depth: sized.depth,
    passes: sized.passes,
    checks: sized.panels.flatMap(({ checks }) => checks),
    panels: sized.panels.map(panelResultOf),
    quantities,
    deadLoad: deadLoadOf(panels, scheme, comparingRules),
    cost: rates ? priceScheme(quantities, ratesOfScheme(rates, scheme.mark, weeks), grossAreaM2(panels), declared, rules) : null,
  }
  return { result, sized, measures }
}

function panelResultOf({ level, mark, depth, areas, layout, moments, steel }: SizedPanel): PanelResult {
  return {
    level,
    mark,
    depth,
    grossArea: toM2(areas.gross),
    clearArea: toM2(areas.clear),
    rows: layout?.rows.length ?? 0,
    blocksWhole: layout?.blocksWhole ?? 0,
    blocksCut: layout?.blocksCut ?? 0,
    moments,
    steel,
  }
}
