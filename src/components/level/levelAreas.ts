import type { Level } from '#shared/contracts/appraisal'
import type { PanelAreas } from '#shared/layout/panelLayout'
import type { SizedScheme } from '#shared/sizing/sizedPanel'
import { toM2 } from '#shared/units'

/** A part of a level's gross area, m², one floor with its panels' repeats. */
export interface LevelArea {
  readonly part: 'supports' | 'field' | 'solid' | 'voids'
  readonly words: string
  readonly areaM2: number
}

/** Gross area of a level and the parts that make it up, as the layout measured them. */
export function levelAreas(level: Pick<Level, 'mark' | 'panels'>, sized: SizedScheme): { grossM2: number; parts: LevelArea[] } {
  const repeats = new Map(level.panels.map(({ mark, repeat }) => [mark, repeat]))
  const panels = sized.panels.filter((panel) => panel.level === level.mark)
  const sum = (area: (areas: PanelAreas) => number) =>
    toM2(panels.reduce((total, { mark, areas }) => total + area(areas) * (repeats.get(mark) ?? 1), 0))
  const isRibbed = sized.kind === 'ribbed'
  const parts: LevelArea[] = [
    { part: 'supports', words: 'over supports', areaM2: sum(({ strips }) => strips) },
    isRibbed
      ? { part: 'field', words: 'blocks and ribs', areaM2: sum(({ blocks, ribs }) => blocks + ribs) }
      : { part: 'field', words: 'solid slab', areaM2: sum(({ clear, voids }) => clear - voids) },
    {
      part: 'solid',
      words: 'solid and cross ribs',
      areaM2: isRibbed ? sum((a) => a.edgeStrips + a.solidZones + a.crossRibs + a.trimmers + a.fillers) : 0,
    },
    { part: 'voids', words: 'voids', areaM2: sum(({ voids }) => voids) },
  ]
  return { grossM2: sum(({ gross }) => gross), parts: parts.filter(({ areaM2 }) => areaM2 > 0) }
}
