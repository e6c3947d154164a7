import type { ChartColours } from './costChartOption'

/** The colour tokens as they are now on the page. */
export function chartColours(): ChartColours {
  const styles = getComputedStyle(document.documentElement)
  const token = (name: string) => styles.getPropertyValue(name).trim()
  return {
    ink: token('--ink'),
    ink2: token('--ink-2'),
    hair: token('--hair'),
    paper: token('--paper'),
    clay: token('--clay'),
    clayInk: token('--clay-ink'),
    clayWash: token('--clay-wash'),
    slate: token('--slate'),
    slateWash: token('--slate-wash'),
  }
}
