import type { DecimalFormat } from './formatDecimal'
import { formatDecimal } from './formatDecimal'

/** Writes a measured number for the reader; a dash where there is none. Without `decimals`, as many as it has, at most six. */
export function formatQuantity(value: number | null | undefined, { decimals, isSigned = false }: DecimalFormat = {}): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return '–'
  const text = decimals === undefined ? String(Number(value.toFixed(6))) : value.toFixed(decimals)
  return formatDecimal(text, { isSigned })
}
