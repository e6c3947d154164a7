import { figure } from './figure'
import { type Finding, isMet } from './finding'

/**
 * What would change the answer of the fire tables, one sentence for each size, axis distance or cover that fails.
 *
 * Source: project rule, the table's answer and what would change it (engine design section 4); blocks and plaster count only by test
 */
export function fireFlags(findings: readonly Finding[]): string[] {
  const failing = findings.filter(({ demand, capacity }) => !isMet(demand, capacity))
  const sentence = ({ name, clause, demand, capacity }: Finding) => {
    const [what, remedy] =
      name === 'fire.size'
        ? ['', 'a larger size']
        : [' from the face to the bars', 'more cover, or a wider rib where its table goes by width,']
    return `fire: ${clause} asks ${figure(demand)} mm${what}, here ${figure(capacity)} mm: ${remedy} would change that, or test evidence for blocks and plaster`
  }
  return [...new Set(failing.filter(({ name }) => name === 'fire.size' || name === 'fire.cover').map(sentence))]
}
