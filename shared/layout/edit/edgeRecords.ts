import type { Edge, Panel } from '../../contracts/appraisal'

/** One record for each edge, in the order of the outline, also where one entry serves all. */
export function edgeRecords({ outline, edges }: Pick<Panel, 'outline' | 'edges'>): Edge[] {
  return outline.map((_, i) => edges[i] ?? edges[0]!)
}
