import type { PanelResult } from '#shared/contracts/appraisalResult'
import type { StoredLevel } from '#shared/contracts/project'
import { formatQuantity } from '../base/formatQuantity'

const NUMBERS = ['no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine', 'ten', 'eleven', 'twelve']

/** Gross area of all floors, repeats in, m². */
export function floorAreaM2(levels: readonly StoredLevel[], panels: readonly PanelResult[]): number {
  return panels.reduce((sum, panel) => {
    const level = levels.find(({ mark }) => mark === panel.level)
    const repeat = level?.panels.find(({ mark }) => mark === panel.mark)?.repeat ?? 1
    return sum + panel.grossArea * repeat * (level?.repeat ?? 1)
  }, 0)
}

/** What is compared, in a line: 'Tarn Court, four suspended floors, 991 m²'. */
export function floorInWords(name: string, levels: readonly StoredLevel[], panels: readonly PanelResult[]): string {
  const count = levels.reduce((sum, { repeat }) => sum + repeat, 0)
  const floors = `${NUMBERS[count] ?? count} suspended floor${count === 1 ? '' : 's'}`
  const area = Math.round(floorAreaM2(levels, panels))
  return `${name}, ${floors}${area > 0 ? `, ${formatQuantity(area)} m²` : ''}`
}
