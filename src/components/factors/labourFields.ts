import type { LabourFactors, LabourOutput } from '#shared/contracts/factors'

type OutputKey = { [Key in keyof LabourFactors]: LabourFactors[Key] extends LabourOutput ? Key : never }[keyof LabourFactors]
type NumberKey = Exclude<keyof LabourFactors, OutputKey>

/** Outputs in the order they are built, with what each figure is per. */
export const OUTPUT_FIELDS: readonly { readonly key: OutputKey; readonly label: string; readonly unit: string }[] = [
  { key: 'soffit', label: 'Soffit formwork, fix and strike', unit: 'h/m²' },
  { key: 'edge', label: 'Edge formwork, fix and strike', unit: 'h/m' },
  { key: 'blocks', label: 'Hollow blocks, laid and ends closed', unit: 'nr/h' },
  { key: 'barsTo8', label: 'Bars to 8 mm', unit: 'kg/h' },
  { key: 'barsTo12', label: 'Bars 10 and 12 mm', unit: 'kg/h' },
  { key: 'barsTo20', label: 'Bars 16 and 20 mm', unit: 'kg/h' },
  { key: 'barsOver20', label: 'Bars 25 mm and over', unit: 'kg/h' },
  { key: 'mesh', label: 'Mesh', unit: 'h/m²' },
  { key: 'concrete', label: 'Concrete, placed and finished', unit: 'h/m³' },
]

/** The rest: who works, how long, and how warm it is while concrete hardens. */
export const GANG_FIELDS: readonly {
  readonly key: NumberKey
  readonly label: string
  readonly unit: string
  readonly least: number
  readonly most: number
  readonly decimals: number
}[] = [
  { key: 'leastGang', label: 'Least gang', unit: 'people', least: 1, most: 500, decimals: 0 },
  { key: 'hoursPerDay', label: 'Working day', unit: 'h', least: 1, most: 24, decimals: 2 },
  { key: 'daysPerWeek', label: 'Working week', unit: 'days', least: 1, most: 7, decimals: 0 },
  { key: 'airTemperature', label: 'Mean air temperature', unit: '°C', least: 1, most: 50, decimals: 1 },
]
