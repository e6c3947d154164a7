import { idleBeyondFlags, stripFlags } from '../analysis/stripFlags'
import type { Finding } from '../finding'
import { fireFlags } from '../fireFlags'
import { slenderFlags } from '../slenderFlags'
import type { SlabContext } from './slabContext'

/**
 * Assumptions and approximations of one solid panel, in sentences.
 *
 * Source: project rule, what was assumed is stated (engine design sections 1, 3 and 4)
 */
export function slabFlags(context: SlabContext, findings: readonly Finding[]): string[] {
  const { plan, analysis } = context
  const sides = [...Object.values(analysis.short.axis.ends), ...Object.values(analysis.other.ends)]
  return [
    ...(analysis.stripAnalysis ? stripFlags(analysis.stripAnalysis, context.basis.redistribution) : [twoWayFlag(context)]),
    ...idleBeyondFlags(
      plan.site.edges,
      analysis.strip ? Object.values(analysis.short.axis.ends).flatMap(({ edges }) => edges) : [],
    ),
    ...(plan.isRectangle ? [] : ['not a rectangle: sized on its least-area enclosing rectangle']),
    ...sides
      .filter(({ isMixed }) => isMixed)
      .map(({ edges }) => `edges ${edges.map((edge) => edge + 1).join(', ')}: continuous in part only, taken as discontinuous`),
    ...(plan.site.panel.voids.length > 0
      ? [
          'sized as without its voids; bars that they cut are made up beside them, half on each side (common practice), and not checked',
        ]
      : []),
    ...cornerFlag(context),
    ...fireFlags(findings),
    ...slenderFlags(findings, context.basis),
  ]
}

function twoWayFlag({ analysis: { panelCase } }: SlabContext): string {
  if (panelCase === null)
    return 'two way, corners may lift: coefficients of BS 8110-1 Table 3.13, no torsion steel; shear of half the short span at every edge'
  return `two way, coefficients of BS 8110-1 Tables 3.14 and 3.15, case ${panelCase}; of unequal support moments the larger counts on both sides`
}

function cornerFlag({ plan, analysis }: SlabContext): string[] {
  if (plan.site.panel.corners === 'held' || (analysis.long && analysis.panelCase === null)) return []
  return [
    analysis.long
      ? 'corners are taken as held: Table 3.13 for corners that may lift needs four discontinuous edges'
      : 'one way: whether corners may lift makes no difference',
  ]
}
