/** A decimal as the database pads it (`12.500000`), as the contract writes it (`12.5`). */
export function plainDecimal(padded: string): string {
  return padded.includes('.') ? padded.replace(/\.?0+$/, '') : padded
}
