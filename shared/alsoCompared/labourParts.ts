import type { LabourFactors, LabourOutput } from '../contracts/factors'
import { figure } from '../sizing/figure'
import type { SchemeMeasures } from '../takeoff/schemeMeasures'

/** Man-hours of one kind of work, all floors. */
export interface LabourPart {
  readonly hours: number
  /** As 'concrete 81.2 m³ × 1.3 h/m³ = 105.6 h'. */
  readonly working: string
}

type Band = 'barsTo8' | 'barsTo12' | 'barsTo20' | 'barsOver20'
const BANDS: readonly { readonly band: Band; readonly name: string; readonly greatest: number }[] = [
  { band: 'barsTo8', name: 'bars to 8 mm', greatest: 8 },
  { band: 'barsTo12', name: 'bars 10 and 12 mm', greatest: 12 },
  { band: 'barsTo20', name: 'bars 16 and 20 mm', greatest: 20 },
  { band: 'barsOver20', name: 'bars 25 mm and over', greatest: Infinity },
]

/**
 * Man-hours of a scheme by kind of work, those of which it has nothing left out: outputs as the firm typed them, times what is measured.
 *
 * Source: outputs by the firm, see each output's own source
 */
export function labourParts(measures: SchemeMeasures, labour: LabourFactors): LabourPart[] {
  const byBand = BANDS.map(({ band, name }) => perHour(name, massOf(measures, band), 'kg', labour[band]))
  return [
    each('concrete', measures.concreteM3, 'm³', labour.concrete),
    ...byBand,
    each('mesh', measures.meshM2, 'm²', labour.mesh),
    perHour('blocks', measures.blockCount, 'nr', labour.blocks),
    each('soffit formwork', measures.soffitM2, 'm²', labour.soffit),
    each('edge formwork', measures.edgeM, 'm', labour.edge),
  ].filter(({ hours }) => hours > 0)
}

const EACH: readonly {
  readonly key: Exclude<keyof LabourFactors, Band | NumberKey>
  readonly name: string
  readonly unit: string
}[] = [
  { key: 'concrete', name: 'concrete', unit: 'h/m³' },
  { key: 'mesh', name: 'mesh', unit: 'h/m²' },
  { key: 'blocks', name: 'blocks', unit: 'nr/h' },
  { key: 'soffit', name: 'soffit formwork', unit: 'h/m²' },
  { key: 'edge', name: 'edge formwork', unit: 'h/m' },
]
type NumberKey = 'leastGang' | 'hoursPerDay' | 'daysPerWeek' | 'airTemperature'

/** Every output that the firm works by, used here or not, under where it comes from. */
export function labourSources(labour: LabourFactors): string {
  const outputs = [
    ...EACH.map(({ key, name, unit }) => ({ ...labour[key], text: `${name} ${labour[key].value} ${unit}` })),
    ...BANDS.map(({ band, name }) => ({ ...labour[band], text: `${name}: ${labour[band].value} kg/h` })),
  ]
  const sources = [...new Set(outputs.map(({ source }) => source))]
  const of = (source: string) => outputs.filter((output) => output.source === source).map(({ text }) => text)
  return sources.map((source) => `${of(source).join(', ')} (${source})`).join('; ')
}

function massOf({ barsKg }: SchemeMeasures, band: Band): number {
  const bandOf = (diameter: number) => BANDS.find(({ greatest }) => diameter <= greatest)!.band
  return Object.entries(barsKg).reduce((sum, [diameter, kg]) => sum + (bandOf(Number(diameter)) === band ? kg : 0), 0)
}

function each(name: string, quantity: number, unit: string, { value }: LabourOutput): LabourPart {
  const hours = quantity * value
  return { hours, working: `${name} ${figure(quantity, 2)} ${unit} × ${value} h/${unit} = ${figure(hours)} h` }
}

function perHour(name: string, quantity: number, unit: string, { value }: LabourOutput): LabourPart {
  const hours = quantity / value
  return { hours, working: `${name} ${figure(quantity, 0)} ${unit} / ${value} ${unit}/h = ${figure(hours)} h` }
}
