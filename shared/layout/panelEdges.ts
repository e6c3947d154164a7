import type { Edge, Panel } from '../contracts/appraisal'
import { OutOfScopeError } from '../outOfScope'

/** One edge record for each side of the outline: a single record serves all. @throws OutOfScopeError when the numbers differ */
export function panelEdges({ outline, edges }: Pick<Panel, 'outline' | 'edges'>): readonly Edge[] {
  if (edges.length === outline.length) return edges
  if (edges.length !== 1) throw new OutOfScopeError('edges', `expected 1 edge, or ${outline.length} as the outline has corners`)
  return outline.map(() => edges[0]!)
}
