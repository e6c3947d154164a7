import { type AppraisalFile, appraisalFile, type AppraisalFileInput, type Edge } from '#shared/contracts/appraisal'

type Point = [number, number]
type PanelInput = AppraisalFileInput['levels'][number]['panels'][number]
type SchemeInput = AppraisalFileInput['schemes'][number]
type Basis = Extract<AppraisalFileInput['brief'], { basis: 'EN1992' }>
type BritishBasis = Extract<AppraisalFileInput['brief'], { basis: 'BS8110' }>

export const loads = { imposedLoad: 2, finishesLoad: 1.5, partitionsLoad: 0.8, cover: 25, fireMinutes: 30 } as const

export const brief: Basis = { basis: 'EN1992', ...loads, fck: 30, fyk: 500 }

export const ribbed: Extract<SchemeInput, { kind: 'ribbed' }> = {
  mark: 'R1',
  kind: 'ribbed',
  block: { length: 200, width: 400, height: 200, mass: 12.5 },
  ribWidth: 100,
  topping: 60,
  mesh: 'A142',
  solidZone: 'least',
}

export const solid: Extract<SchemeInput, { kind: 'solid' }> = { mark: 'S1', kind: 'solid', thickness: 'least' }

export const rectangle = (x: number, y: number, width: number, height: number): Point[] => [
  [x, y],
  [x + width, y],
  [x + width, y + height],
  [x, y + height],
]

export const edge = (continuity: Edge['continuity'], supportWidth = 250) => ({
  supportWidth: continuity === 'free' ? 0 : supportWidth,
  continuity,
})

/** A rectangular panel; `continuous` lists its continuous edges: 0 below, 1 right, 2 above, 3 left. */
export function panelOf(mark: string, outline: Point[], continuous: readonly number[], ribDirection = 0): PanelInput {
  const edges = outline.map((_, i) => edge(continuous.includes(i) ? 'continuous' : 'discontinuous'))
  return { mark, outline, edges, ribDirection }
}

/** Panels side by side from left to right, continuous with one another, simple at both ends of the row. */
export function row(widths: readonly number[], height: number, ribDirection = 0): PanelInput[] {
  return widths.map((width, i) => {
    const x = widths.slice(0, i).reduce((sum, each) => sum + each, 0)
    const continuous = [...(i < widths.length - 1 ? [1] : []), ...(i > 0 ? [3] : [])]
    return panelOf(`P${i + 1}`, rectangle(x, 0, width, height), continuous, ribDirection)
  })
}

export function fileOf(panels: readonly PanelInput[], changes: Partial<Basis> = {}): AppraisalFile {
  return appraisalFile.parse({
    format: 'bothways.appraisal/1',
    brief: { ...brief, ...changes },
    levels: [{ mark: 'L1', panels }],
    schemes: [ribbed, solid],
  })
}

/** The same floor by BS 8110: concrete of the same class, high yield steel. */
export function britishFileOf(panels: readonly PanelInput[], changes: Partial<BritishBasis> = {}): AppraisalFile {
  return appraisalFile.parse({ ...fileOf(panels), brief: { basis: 'BS8110', ...loads, fcu: 37, fy: 460, ...changes } })
}

/** A scheme with its defaults filled in. */
export function schemeOf(scheme: SchemeInput) {
  return appraisalFile.shape.schemes.parse([scheme])[0]!
}
