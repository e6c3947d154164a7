import type { AppraisalFile } from '#shared/contracts/appraisal'
import type { FileOrigin } from './appraisalAnswer'
import { panelsLeftOut, withoutGiven } from './withoutGiven'

/** A file and where its rows came from. */
export interface TracedFile {
  readonly file: AppraisalFile
  readonly origin: FileOrigin
}

const LEVEL_OR_PANEL = /^levels\.(\d+)(?:\.panels\.(\d+))?/

/** True for a path that names a level or one of its panels. */
export const namesFloor = (path: string): boolean => LEVEL_OR_PANEL.test(path)

/** The path as the sheet counts its rows. */
export function pathInSheet(path: string, { levels, schemes }: FileOrigin): string {
  const [whole, level, panel] = LEVEL_OR_PANEL.exec(path) ?? []
  if (whole !== undefined) {
    const row = levels[Number(level)]
    const start = `levels.${row?.index ?? level}`
    return (panel === undefined ? start : `${start}.panels.${row?.panels[Number(panel)] ?? panel}`) + path.slice(whole.length)
  }
  return path.replace(/^schemes\.(\d+)/, (_, scheme: string) => `schemes.${schemes[Number(scheme)] ?? scheme}`)
}

/** The file without the levels, panels and schemes that the paths name; a level left without a panel goes too. */
export function withoutRows({ file, origin }: TracedFile, paths: readonly string[]): TracedFile {
  const isLeft = (row: string) => !paths.some((path) => path === row || path.startsWith(`${row}.`))
  const isWholeLevelLeft = (level: number) =>
    !paths.some((path) => LEVEL_OR_PANEL.exec(path)?.[1] === String(level) && !path.startsWith(`levels.${level}.panels.`))
  const levels = file.levels.flatMap((row, level) => {
    const left = row.panels.map((_, panel) => panel).filter((panel) => isLeft(`levels.${level}.panels.${panel}`))
    const from = origin.levels[level]
    if (left.length === 0 || from === undefined || !isWholeLevelLeft(level)) return []
    return [
      {
        row: { ...row, panels: row.panels.filter((_, panel) => left.includes(panel)) },
        from: { index: from.index, panels: from.panels.filter((_, panel) => left.includes(panel)) },
      },
    ]
  })
  const schemes = file.schemes.map((_, scheme) => scheme).filter((scheme) => isLeft(`schemes.${scheme}`))
  const rows = levels.map(({ row }) => row)
  const kept = file.schemes.filter((_, scheme) => schemes.includes(scheme))
  return {
    file: { ...file, levels: rows, schemes: withoutGiven(kept, panelsLeftOut(file.levels, rows)) },
    origin: { levels: levels.map(({ from }) => from), schemes: origin.schemes.filter((_, scheme) => schemes.includes(scheme)) },
  }
}

/** Number of panels and schemes in the file. */
export const rowCount = ({ file }: TracedFile): number =>
  file.levels.reduce((sum, { panels }) => sum + panels.length, file.schemes.length)
