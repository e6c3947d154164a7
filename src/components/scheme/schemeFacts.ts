import type { Scheme } from '#shared/contracts/appraisal'
import type { SchemeResult } from '#shared/contracts/appraisalResult'
import { fieldCheck } from '#shared/layout/fieldCheck'
import type { SizedScheme } from '#shared/sizing/sizedPanel'
import { formatDecimal } from '../base/formatDecimal'
import { formatQuantity } from '../base/formatQuantity'
import { checksInWords } from '../check/checkRows'

export interface SchemeFact {
  readonly label: string
  readonly value: string
  readonly isWrong?: boolean
}

/** Field check of the specification, then what the floors came to with it; only what is known. */
export function schemeFacts(scheme: Scheme, result: SchemeResult | null, sized: SizedScheme | null): SchemeFact[] {
  return [...field(scheme, result), ...(result === null ? [] : floors(result)), ...zones(sized)]
}

function field(scheme: Scheme, result: SchemeResult | null): SchemeFact[] {
  if (scheme.kind === 'ribbed') {
    const { blocksPerM2, concretePerM2 } = fieldCheck(scheme)
    return [
      { label: 'Blocks in the field, away from edges', value: `${formatQuantity(blocksPerM2, { decimals: 1 })} /m²` },
      { label: 'Concrete in the field', value: `${formatQuantity(concretePerM2, { decimals: 3 })} m³/m²` },
    ]
  }
  const depth = scheme.thickness === 'least' ? result?.depth : scheme.thickness
  return depth === undefined
    ? []
    : [{ label: 'Concrete in the field', value: `${formatQuantity(depth / 1000, { decimals: 3 })} m³/m²` }]
}

function floors(result: SchemeResult): SchemeFact[] {
  const { depth, deadLoad, passes, cost } = result
  return [
    { label: 'Overall depth', value: `${formatQuantity(depth)} mm` },
    { label: 'Dead load, gross', value: `${formatQuantity(deadLoad.perArea, { decimals: 2 })} kN/m²` },
    { label: 'Checks', value: checksInWords(result).replace(/\.$/, ''), isWrong: !passes },
    ...(cost === null
      ? []
      : [
          { label: 'Floors', value: `${formatDecimal(cost.total)} ${cost.currency}` },
          { label: 'for each m² of gross floor', value: `${formatDecimal(cost.perArea)} ${cost.currency}` },
        ]),
  ]
}

/** Solid zones as they were laid, where the engine widened them. */
function zones(sized: SizedScheme | null): SchemeFact[] {
  const laid = (sized?.panels ?? []).flatMap(({ layout }) => (layout === null ? [] : [layout.solidZone]))
  if (laid.length === 0) return []
  const [least, greatest] = [Math.min(...laid), Math.max(...laid)].map((value) => formatQuantity(Math.round(value)))
  return [{ label: 'Solid zones as laid', value: least === greatest ? `${least} mm` : `${least} to ${greatest} mm` }]
}
