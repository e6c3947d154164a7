import type { BarDiameter } from '../contracts/appraisal'

/** A limit or resistance with where it stands in the code and how it was worked out; the text is written only when shown. */
export interface Answer {
  readonly value: number
  readonly clause: string
  readonly working: () => string
}

/** Partial factors of the ultimate limit state; `unloaded` multiplies the permanent load of spans that a pattern leaves unloaded. */
export interface LoadFactors {
  readonly permanent: number
  readonly variable: number
  readonly unloaded: number
  readonly clause: string
}

/** A section in bending, mm: `width` of the compression face, effective `depth`; `flange` where it is a T with its flange compressed. */
export interface BendingSection {
  readonly widthMm: number
  readonly depthMm: number
  readonly flange: { readonly webMm: number; readonly thicknessMm: number } | null
}

/** What a section needs in bending. */
export interface Flexure {
  readonly k: number
  readonly greatestK: number
  readonly leverArmMm: number
  readonly requiredMm2: number
  readonly clause: string
  /** The formula for K, and the one for steel, with their numbers. */
  readonly kWorking: () => string
  readonly steelWorking: () => string
}

/** A section in shear without links, mm: least `width` over the tension zone, effective `depth`, tension `steel` anchored there, mm². */
export interface ShearSection {
  readonly widthMm: number
  readonly depthMm: number
  readonly steelMm2: number
}

/** Where a span lies in its line of spans. */
export type SpanPosition = 'simple' | 'end' | 'interior'

/** What the span to depth rule looks at. */
export interface SpanDepthInput {
  readonly position: SpanPosition
  readonly spanMm: number
  readonly section: BendingSection
  readonly momentNmm: number
  readonly requiredMm2: number
  readonly providedMm2: number
  readonly carriesPartitions: boolean
}

/** Tension zone of a section for least steel, mm: its mean `width`, `web`, overall `height` and effective `depth`. */
export interface TensionZone {
  readonly widthMm: number
  readonly webMm: number
  readonly heightMm: number
  readonly depthMm: number
}

/** One end of a span: support width along the span, mm, and whether the floor goes on behind it. */
export interface SpanEnd {
  readonly supportMm: number
  readonly isContinuous: boolean
}

/** Where bars lie, for their greatest spacing. */
export type BarPlace = 'greatestMoment' | 'principal' | 'secondary'

/** How a solid slab carries, for its fire table. */
export type SlabAction = 'oneWay' | 'twoWay' | 'twoWayLong'

/** Fire demand: least `size` and least axis distance `axisMm` of bars, mm; `sideAxisMm` to the side face where the table asks more there. */
export interface FireDemand {
  readonly size: Answer
  readonly axisMm: Answer
  readonly sideAxisMm: Answer | null
}

/** A ribbed floor's shape, mm. */
export interface RibShape {
  readonly clearMm: number
  readonly ribMm: number
  readonly blockHeightMm: number
  readonly toppingMm: number
}

/** A demand and a capacity that a code compares, in its own unit. */
export interface Comparison {
  readonly demand: number
  readonly capacity: number
  readonly unit: string
  readonly clause: string
  readonly working: () => string
}

/**
 * Everything the engine asks of a code of practice, answered for one brief's strengths. Inner units: N, mm, MPa.
 * A new basis is a folder with one function that returns this, and a line in `codeBases`.
 */
export interface CodeBasis {
  readonly title: string
  readonly loadFactors: LoadFactors
  /** Top steel at edges designed as simple: share of the midspan moment and reach from the face as a share of the span. */
  readonly simpleEdge: { readonly share: number; readonly reach: number; readonly clause: string }
  /** Secondary steel as a share of the principal. */
  readonly secondary: { readonly share: number; readonly clause: string }
  effectiveSpanMm(clearMm: number, heightMm: number, depthMm: number, ends: readonly [SpanEnd, SpanEnd]): number
  flangeWidthMm(position: SpanPosition, spanMm: number, webMm: number, clearMm: number): Answer
  /** `redistributedShare` of the moment was taken off at this section, 0 to 0.3. */
  flexure(section: BendingSection, momentNmm: number, redistributedShare: number): Flexure
  shearResistanceN(section: ShearSection): Answer
  spanDepthLimit(input: SpanDepthInput): Answer
  leastSteelMm2(zone: TensionZone): Answer
  mostSteelMm2(concreteMm2: number): Answer
  greatestSpacingMm(place: BarPlace, heightMm: number): Answer
  leastGapMm(diameterMm: BarDiameter, aggregateMm: number): Answer
  /** Of a bar stressed to a share of its design strength, 0 to 1. */
  anchorageMm(diameterMm: BarDiameter, isTopOfDeepSection: boolean, stressShare: number): Answer
  lapMm(diameterMm: BarDiameter, isTopOfDeepSection: boolean): Answer
  ribProportions(shape: RibShape): readonly Comparison[]
  leastToppingMm(shape: RibShape): Answer
  /** Greatest clear length of ribs between cross ribs or solid zones, mm; null where the code has no rule. */
  crossRibSpacingMm(heightMm: number): Answer | null
  slabFire(minutes: number, action: SlabAction): FireDemand
  ribFire(minutes: number, ribMm: number, isContinuous: boolean, redistributedShare: number): FireDemand
}
