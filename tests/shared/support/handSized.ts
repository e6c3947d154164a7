import type { Level, Panel, RibbedScheme, Scheme } from '#shared/contracts/appraisal'
import { level as levelContract, scheme as schemeContract } from '#shared/contracts/appraisal'
import { layOutPanel } from '#shared/layout/layOutPanel'
import { findSharedEdges } from '#shared/layout/neighbours'
import { solidAreas } from '#shared/layout/solidAreas'
import type { BarRun, SizedPanel, SizedScheme } from '#shared/sizing/sizedPanel'

/** Upright rectangle, anticlockwise from its lower left corner, mm. */
export const rectangle = (x: number, y: number, lx: number, ly: number): [number, number][] => [
  [x, y],
  [x + lx, y],
  [x + lx, y + ly],
  [x, y + ly],
]

/** Layers that stand for none: measuring looks at the runs alone. */
const NO_LAYERS = { bottomX: { diameter: 8, spacing: 200 }, bottomY: { diameter: 8, spacing: 200 } } as const

/** A level read by the contract, so that defaults are in. */
export const levelOf = (...panels: Partial<Panel>[]): Level =>
  levelContract.parse({
    mark: 'L1',
    panels: panels.map((panel, index) => ({
      mark: `P${index + 1}`,
      edges: [{ supportWidth: 250, continuity: 'discontinuous' }],
      ribDirection: 90,
      ...panel,
    })),
  })

export const ribbedOf = (changes: Partial<RibbedScheme> = {}): RibbedScheme =>
  schemeContract.parse({
    mark: 'R1',
    kind: 'ribbed',
    block: { length: 200, width: 400, height: 200, mass: 12.5 },
    ribWidth: 100,
    topping: 50,
    mesh: 'A142',
    solidZone: 200,
    ...changes,
  }) as RibbedScheme

export const solidOf = (thickness: number): Scheme => schemeContract.parse({ mark: 'S1', kind: 'solid', thickness })

/**
 * A scheme laid out for real and given bars and depth by hand, so that measuring is tested apart from sizing.
 *
 * @param bars - in every panel
 */
export function handSized(scheme: Scheme, levels: readonly Level[], bars: readonly BarRun[] = []): SizedScheme {
  const depth = scheme.kind === 'ribbed' ? scheme.block.height + scheme.topping : Number(scheme.thickness)
  const panels = levels.flatMap((level) => {
    const shared = findSharedEdges(level)
    return level.panels.map((panel, index): SizedPanel => {
      const layout = scheme.kind === 'ribbed' ? layOutPanel(panel, scheme, Number(scheme.solidZone), null, shared[index]!) : null
      const areas = layout?.areas ?? solidAreas(panel, shared[index]!)
      const moments = { midspan: 0, support: 0 }
      const steel = { midspanRequired: 0, midspanProvided: 0, supportRequired: 0, supportProvided: 0 }
      return {
        level: level.mark,
        mark: panel.mark,
        depth,
        areas,
        layout,
        checks: [],
        places: [],
        moments,
        steel,
        bars,
        reinforcement:
          scheme.kind === 'ribbed' ? { kind: 'ribbed', ribBars: [], topBars: [] } : { kind: 'solid', bars: NO_LAYERS },
        fire: { minutes: 60, limits: [] },
        flags: [],
      }
    })
  })
  return { mark: scheme.mark, kind: scheme.kind, depth, passes: true, panels }
}

/** A run of bars as the take-off needs it. */
export const barRun = (diameter: BarRun['diameter'], count: number, lengthMm: number): BarRun => ({
  position: 'bottom, along ribs',
  diameter,
  count,
  lengthMm,
  shape: { code: '00', dimensionsMm: [lengthMm] },
  spacingMm: null,
  countWorking: `${count}`,
  lengthWorking: `${lengthMm}`,
  clause: 'given',
})
