import { roundAsPrinted } from '../takeoff/roundAsPrinted'
import { Decimal } from './decimal'

/**
 * The one gate from measuring to money: a figure with exactly the digits it is printed with, as a string.
 *
 * Source: project rule, quantities are priced as printed
 * @param decimals - 0 to 6; halves are rounded away from zero
 */
export function toQuantity(value: number, decimals: number): string {
  return new Decimal(roundAsPrinted(value, decimals)).toFixed(decimals)
}
