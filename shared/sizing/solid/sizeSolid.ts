import type { Brief, SlabLayers, SolidScheme } from '../../contracts/appraisal'
import type { BarLines } from '../bars/barLines'
import { barRuns } from '../bars/barRuns'
import { overSupports } from '../bars/overSupports'
import type { CodeBasis } from '../codeBasis'
import { exposureFindings } from '../exposureFindings'
import { givenFlags } from '../givenFlags'
import { fireStanding } from '../fireStanding'
import { checkRow, type Finding } from '../finding'
import type { LevelSite } from '../panelSite'
import { remember } from '../remember'
import type { SizedPanel } from '../sizedPanel'
import { chooseSlabBars, type SlabBars } from './bars/chooseSlabBars'
import { soffitSteps } from './soffitSteps'
import { slabBarLines } from './bars/slabBarLines'
import { fireFindings, sizeFindings } from './layerFindings'
import { isHogging, type SlabContext, slabKey } from './slabContext'
import { slabFlags } from './slabFlags'
import { layerAreaMm2 } from './bars/slabLayer'
import { hopelessThicknessFlags } from './hopelessThickness'
import { solidContexts } from './solidContexts'

type BarsFor = ReturnType<typeof remember<SlabBars>>

/**
 * The panels of all levels built solid, at the given thickness, the least that passes in every panel, or the least of each.
 *
 * Signs: moments and forces are magnitudes, sagging and hogging apart. Lengths mm, forces N, moments N·mm, per metre of width. `short`
 * is the direction spanned first, whose bars lie nearest the faces; `long` the other.
 *
 * Source: project rule, engine design sections 3 and 4
 * @throws OutOfScopeError where free edges leave a panel no two opposite supports, or the cover takes up the depth
 */
export function sizeSolid(sites: readonly LevelSite[], scheme: SolidScheme, brief: Brief, basis: CodeBasis): SizedPanel[] {
  const barsFor: BarsFor = remember()
  return solidContexts(sites, scheme, brief, basis).flatMap(({ site, heightsMm, contexts }) => {
    const bars = contexts.map((context) => barsFor(slabKey(context), () => chooseSlabBars(context)))
    const lines = overSupports(
      site,
      contexts.map((context, i) => slabBarLines(context, bars[i]!)),
    )
    return contexts.map((context, i) => {
      const notes = [...soffitSteps(site, heightsMm, i), ...givenFlags(scheme, site.mark, context.plan.site.panel.mark)]
      return sizedPanel(context, scheme, site.mark, { chosen: bars[i]!, lines: lines[i]! }, notes)
    })
  })
}

/** Bars of a panel as chosen, and as they are to be scheduled. */
interface PanelBars {
  readonly chosen: SlabBars
  readonly lines: readonly BarLines[]
}

function sizedPanel(
  context: SlabContext,
  scheme: SolidScheme,
  level: string,
  { chosen, lines }: PanelBars,
  notes: readonly string[],
): SizedPanel {
  const { plan, heightMm } = context
  const { mark } = plan.site.panel
  const findings = [...chosen.findings, ...sizeFindings(context), ...outermostFindings(context, chosen)]
  return {
    level,
    mark,
    depth: heightMm,
    areas: plan.areas,
    layout: null,
    checks: findings.map((finding) => checkRow(finding, level, mark)),
    places: findings.map(({ place }) => place()),
    moments: momentsOf(context),
    steel: steelOf(chosen),
    bars: lines.flatMap(barRuns),
    reinforcement: { kind: 'solid', bars: layersOf(chosen) },
    fire: fireStanding((minutes) => [
      ...sizeFindings(context, minutes),
      ...fireFindings(context, chosen.bottom.short.middle, minutes),
    ]),
    flags: [...slabFlags(context, findings), ...hopelessThicknessFlags(context, scheme, findings), ...notes],
  }
}

/** Cover of the bars nearest the faces: those of the direction spanned first, at the bottom and at its ends. */
function outermostFindings({ basis, brief }: SlabContext, { bottom, tops }: SlabBars): Finding[] {
  const outer = tops.flatMap(({ place, layers }) => (place.direction === 'short' && layers ? [layers.middle.diameter] : []))
  return exposureFindings(basis, {
    coverMm: brief.cover,
    linkMm: 0,
    diameterMm: Math.max(bottom.short.middle.diameter, ...outer),
  })
}

/** Layers as a scheme gives them; at the top the heaviest of each direction. */
function layersOf({ bottom, tops }: SlabBars): SlabLayers {
  const top = (direction: 'short' | 'long') =>
    tops
      .flatMap(({ place, layers }) => (place.direction === direction && layers ? [layers.middle] : []))
      .sort((a, b) => layerAreaMm2(b) - layerAreaMm2(a))[0]
  const [topX, topY] = [top('short'), top('long')]
  return { bottomX: bottom.short.middle, bottomY: bottom.long.middle, ...(topX ? { topX } : {}), ...(topY ? { topY } : {}) }
}

function momentsOf({ analysis: { short, long } }: SlabContext): SizedPanel['moments'] {
  const support = ({ ends }: typeof short) => Math.max(ends.start.hoggingNmm, ends.end.hoggingNmm) / 1e6
  const moments = { midspan: short.saggingNmm / 1e6, support: support(short) }
  return long ? { ...moments, midspanLong: long.saggingNmm / 1e6, supportLong: support(long) } : moments
}

/** Steel of the short direction: at midspan, and at the continuous end that asks most; zeros without one. */
function steelOf({ bottom, tops, midspan }: SlabBars): SizedPanel['steel'] {
  const supports = tops
    .filter(({ place }) => place.direction === 'short' && isHogging(place))
    .map(({ flexure, layers }) => ({ required: flexure.requiredMm2, provided: layers ? layerAreaMm2(layers.middle) : 0 }))
  const worst = supports.reduce(
    (most, each) => (each.required > most.required ? each : most),
    supports[0] ?? { required: 0, provided: 0 },
  )
  return {
    midspanRequired: midspan.requiredMm2,
    midspanProvided: layerAreaMm2(bottom.short.middle),
    supportRequired: worst.required,
    supportProvided: worst.provided,
  }
}
