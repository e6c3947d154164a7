import type { Edge, Panel, Ring } from '#shared/contracts/appraisal'

/** Continuity of the edges of an outline in order, one letter each: c continuous, d discontinuous. */
export function edgesOf(continuities: string, supportWidth: number): Edge[] {
  return [...continuities].map((letter) => ({
    supportWidth,
    kind: 'beam',
    continuity: letter === 'c' ? 'continuous' : 'discontinuous',
  }))
}

/** Outline of a rectangle with its lower left corner at (x, y), anticlockwise from there. */
export function rectangle(x: number, y: number, width: number, height: number): Ring {
  return [
    [x, y],
    [x + width, y],
    [x + width, y + height],
    [x, y + height],
  ]
}

/** A panel on beams, ribs along y unless said. */
export function panelOf(
  mark: string,
  outline: Ring,
  edges: Edge[],
  { ribDirection = 90, voids = [] }: { ribDirection?: number; voids?: Ring[] } = {},
): Panel {
  return { mark, repeat: 1, outline, edges, ribDirection, voids, corners: 'held' }
}
