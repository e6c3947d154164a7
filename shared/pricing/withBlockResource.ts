import type { BuildUp } from '../contracts/buildUp'

/** A build-up with the resource of a scheme's own block where it takes the price of the block. */
export function withBlockResource(buildUp: BuildUp, priceCode: string): BuildUp {
  const materials = buildUp.materials.map((line) => (line.isBlock ? { ...line, resource: priceCode } : line))
  return { ...buildUp, materials }
}
