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
export type SpanPosition = 'simple' | 'end' | 'interior' | 'cantilever'

/** What a code says of support moments that are redistributed after a linear elastic analysis. */
export interface RedistributionRules {
  /** Greatest share of a support moment that may be taken off. */
  readonly greatestShare: number
  /** Neighbouring spans may not be further apart than this ratio; null without such a rule. */
  readonly greatestSpanRatio: number | null
  /** Share of the greatest elastic moment that every section must still resist; 0 without such a rule. */
  readonly leastElasticShare: number
  readonly clause: string
}

/** What the span to depth rule looks at; of a cantilever its support, where the flange is pulled and the web pressed. */
export interface SpanDepthInput {
  readonly position: SpanPosition
  readonly spanMm: number
  readonly section: BendingSection
  readonly momentNmm: number
  readonly requiredMm2: number
  readonly providedMm2: number
  readonly carriesPartitions: boolean
}

/**
 * Tension zone of a section for least steel, mm: its mean `width`, the `web` and the `flange` of a T (equal in a rectangle), overall
 * `height` and effective `depth`. `tension` says which part of the section is pulled.
 */
export interface TensionZone {
  readonly tension: 'rectangle' | 'web' | 'flange'
  readonly widthMm: number
  readonly webMm: number
  readonly flangeMm: number
  readonly heightMm: number
  readonly depthMm: number
}

/** Members with detailing rules of their own. */
export type Member = 'slab' | 'rib'

/** Top steel at an edge designed as simple: a share of the midspan moment or of the midspan steel, and its reach as a share of the span. */
export interface SimpleEdge {
  readonly share: number
  readonly of: 'moment' | 'steel'
  /** Whether it is no less than the least steel of the section. */
  readonly isAtLeastLeast: boolean
  readonly reach: number
  readonly clause: string
}

/** One end of a span: support width along the span, mm, and whether the floor goes on behind it. */
export interface SpanEnd {
  readonly supportMm: number
  readonly isContinuous: boolean
}

/** Where bars lie, for their greatest spacing. */
export type BarPlace = 'greatestMoment' | 'principal' | 'secondary'

/** Bars of a slab whose spacing is limited, mm. `redistributedShare` of the moment was taken off there. */
export interface SpacedBars {
  readonly place: BarPlace
  readonly heightMm: number
  readonly depthMm: number
  readonly diameterMm: BarDiameter
  readonly redistributedShare: number
}

/** What the bond of a bar depends on: at the top of a section as cast, its depth, mm, and whether in a corner of the section. */
export interface BarBond {
  readonly isTop: boolean
  readonly sectionMm: number
  readonly isCorner: boolean
}

/** How far a bottom bar passes the face of its support, mm: what anchors it, and what it is usually given where there is room. */
export interface BottomEnd {
  readonly leastMm: number
  readonly usualMm: number
  readonly clause: string
}

/** How a solid slab carries, for its fire table. */
export type SlabAction = 'oneWay' | 'twoWay' | 'twoWayLong'

/**
 * Fire demand: least `size`, mm, and least distance `bars` of the bars from the face, mm, measured to their axis or as cover to the
 * outermost; `sideAxisMm` to the side face where the table asks more there.
 */
export interface FireDemand {
  readonly size: Answer
  readonly bars: Answer
  readonly measuredTo: 'axis' | 'cover'
  readonly sideAxisMm: Answer | null
}

/** What cover for durability and bond depends on, mm: cover to the outermost bar, the link there, 0 for none, and the thickest bar. */
export interface ExposedBars {
  readonly coverMm: number
  readonly linkMm: number
  readonly diameterMm: number
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
  readonly redistribution: RedistributionRules
  /** Span over depth beyond which the code tabulates nothing, its greatest factor for steel included. */
  readonly greatestTabulatedSpanDepth: number
  readonly simpleEdge: Readonly<Record<Member, SimpleEdge>>
  /** Clause of `effectiveSpanMm`. */
  readonly effectiveSpanClause: string
  effectiveSpanMm(clearMm: number, heightMm: number, depthMm: number, ends: readonly [SpanEnd, SpanEnd]): number
  flangeWidthMm(position: SpanPosition, spanMm: number, webMm: number, clearMm: number): Answer
  /** `redistributedShare` of the moment was taken off at this section, 0 to 0.3. */
  flexure(section: BendingSection, momentNmm: number, redistributedShare: number): Flexure
  shearResistanceN(section: ShearSection): Answer
  spanDepthLimit(input: SpanDepthInput): Answer
  leastSteelMm2(zone: TensionZone): Answer
  mostSteelMm2(concreteMm2: number): Answer
  /** Steel across the principal bars of a one-way slab, whose section `zone` is. */
  secondarySteelMm2(principalMm2: number, zone: TensionZone): Answer
  /** Mesh in the topping of a ribbed floor, mm² per metre each way. */
  toppingMeshMm2(toppingMm: number): Answer
  /** Between the middles of bars. */
  greatestSpacingMm(bars: SpacedBars): Answer
  leastGapMm(diameterMm: BarDiameter, aggregateMm: number): Answer
  /** Of a bar stressed to a share of its design strength, 0 to 1. */
  anchorageMm(diameterMm: BarDiameter, bond: BarBond, stressShare: number): Answer
  lapMm(diameterMm: BarDiameter, bond: BarBond): Answer
  bottomEnd(diameterMm: BarDiameter, end: SpanEnd, depthMm: number): BottomEnd
  ribProportions(shape: RibShape): readonly Comparison[]
  leastToppingMm(shape: RibShape): Answer
  /** Greatest clear length of ribs between cross ribs or solid zones, mm; null where the code has no rule. */
  crossRibSpacingMm(heightMm: number): Answer | null
  /** Cover by the exposure of the brief; nothing where it names none. */
  exposureCover(bars: ExposedBars): readonly Comparison[]
  slabFire(minutes: number, action: SlabAction, isContinuous: boolean): FireDemand
  ribFire(minutes: number, ribMm: number, isContinuous: boolean, redistributedShare: number): FireDemand
}
