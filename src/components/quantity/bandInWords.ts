import type { Band, Stage } from '#shared/contracts/measurement'

const DIMENSION: Readonly<Record<Stage['of'], string>> = {
  thickness: 'thick',
  edgeDepth: 'deep',
  proppingHeight: 'to soffit',
}

/** Heights are read in metres, all else in millimetres. */
function length(mm: number, of: Stage['of']): string {
  return of === 'proppingHeight' ? (mm / 1000).toFixed(1) : String(mm)
}

function stageInWords({ of, over, upTo }: Stage): string {
  const unit = of === 'proppingHeight' ? 'm' : 'mm'
  const ends = [
    ...(over > 0 ? [`over ${length(over, of)}`] : []),
    ...(upTo === null ? [] : [`${over > 0 ? '' : 'up to '}${length(upTo, of)}`]),
  ]
  return `${ends.join(' to ')} ${unit} ${DIMENSION[of]}`
}

/** A stage as the description of an item has it: 'up to 300 mm thick', 'over 3.0 to 4.5 m to soffit', '250 mm overall'. */
export function bandInWords(band: Band): string {
  return band.of === 'overallDepth' ? `${band.mm} mm overall` : stageInWords(band)
}

/** Stages after the name of their item; nothing where there are none. */
export function withBands(name: string, bands: readonly Band[] = []): string {
  return [name, ...bands.map(bandInWords)].join(', ')
}
