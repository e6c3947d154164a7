import { areaOf } from '../geometry/region'
import type { LaidRow } from './laidRow'
import type { PanelField } from './panelField'
import type { PanelAreas } from './panelLayout'
import type { KindWindow } from './solidWindows'
import type { StripAreas } from './stripAreas'

type Parts = Record<'blocks' | KindWindow['kind'] | 'trimmers' | 'voids', number>

/**
 * Plan areas of a laid-out panel, mm², each measured on its own region; they add up to the clear area. A forgiven fit
 * (0.001 mm) is settled with the largest part of concrete.
 *
 * @param gross - area of the panel's outline, mm²
 */
export function ribbedAreas(
  field: PanelField,
  rows: readonly LaidRow[],
  windows: readonly KindWindow[],
  strips: StripAreas,
  gross: number,
): PanelAreas {
  const parts: Parts = {
    blocks: blockArea(rows),
    ribs: 0,
    edgeStrips: 0,
    solidZones: 0,
    crossRibs: 0,
    fillers: 0,
    trimmers: Math.max(0, field.trimmersArea),
    voids: Math.max(0, field.voidsArea),
  }
  for (const window of windows) parts[window.kind] += window.isWhole ? fullArea(window) : Math.max(0, areaOf(field.free, window))
  return { gross, ...strips, clear: field.clearArea, ...settled(parts, field.clearArea) }
}

function fullArea({ left, right, bottom, top }: KindWindow): number {
  return (right - left) * (top - bottom)
}

function blockArea(rows: readonly LaidRow[]): number {
  let area = 0
  for (const { bandStart, bandEnd, filled } of rows)
    for (const { runs } of filled) for (const { start, end } of runs) area += (end - start) * (bandEnd - bandStart)
  return area
}

/** @throws Error when the parts miss the whole by more than fits were forgiven: a fault of the layout, never of the input */
function settled(parts: Parts, clearArea: number): Parts {
  const missing = clearArea - Object.values(parts).reduce((sum, part) => sum + part, 0)
  if (Math.abs(missing) > 1e-4 * clearArea + 1) throw new Error(`layout areas miss the clear area by ${missing} mm²`)
  const concrete = ['ribs', 'edgeStrips', 'solidZones', 'crossRibs', 'fillers', 'trimmers'] as const
  const largest = concrete.reduce((best, kind) => (parts[kind] > parts[best] ? kind : best))
  return { ...parts, [largest]: Math.max(0, parts[largest] + missing) }
}
