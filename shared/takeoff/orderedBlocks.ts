import type { CatalogueBlock } from '../contracts/blockCatalogue'

/** Keeps a count that is whole but for rounding from being raised by one. */
const ROUNDING = 1e-9

/**
 * Blocks to order for a net count: breakage on top, rounded up to a whole block, and to a whole pallet where the catalogue
 * has one. Net and order are never mixed: prices and volumes go by the net count.
 *
 * Source: project rule, order quantity = net × (1 + breakage)
 * @param net - blocks as laid, ≥ 0
 */
export function orderedBlocks(
  net: number,
  { breakagePercent, palletCount }: Pick<CatalogueBlock, 'breakagePercent' | 'palletCount'>,
): number {
  const whole = Math.max(0, Math.ceil(net * (1 + Number(breakagePercent) / 100) - ROUNDING))
  return palletCount === null ? whole : Math.ceil(whole / palletCount) * palletCount
}
