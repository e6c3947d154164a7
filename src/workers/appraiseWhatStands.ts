import type { ApiIssue } from '#shared/contracts/apiError'
import type { AppraisalFile } from '#shared/contracts/appraisal'
import { OutOfScopeError } from '#shared/outOfScope'
import type { FileOrigin, FullAppraisal } from './appraisalAnswer'

interface Attempt {
  readonly file: AppraisalFile
  readonly origin: FileOrigin
}

const without = <T>(list: readonly T[], index: number): T[] => list.filter((_, at) => at !== index)

/** The path as the sheet counts its rows. */
function pathInSheet(path: string, { levels, schemes }: FileOrigin): string {
  return path
    .replace(/^levels\.(\d+)\.panels\.(\d+)/, (_, level: string, panel: string) => {
      const row = levels[Number(level)]
      return `levels.${row?.index ?? level}.panels.${row?.panels[Number(panel)] ?? panel}`
    })
    .replace(/^levels\.(\d+)(?!\.panels)/, (_, level: string) => `levels.${levels[Number(level)]?.index ?? level}`)
    .replace(/^schemes\.(\d+)/, (_, scheme: string) => `schemes.${schemes[Number(scheme)] ?? scheme}`)
}

function withoutLevel({ file, origin }: Attempt, level: number): Attempt {
  return {
    file: { ...file, levels: without(file.levels, level) },
    origin: { ...origin, levels: without(origin.levels, level) },
  }
}

function withoutPanel({ file, origin }: Attempt, level: number, panel: number): Attempt {
  const panels = without(file.levels[level]?.panels ?? [], panel)
  if (panels.length === 0) return withoutLevel({ file, origin }, level)
  return {
    file: { ...file, levels: file.levels.map((row, at) => (at === level ? { ...row, panels } : row)) },
    origin: {
      ...origin,
      levels: origin.levels.map((row, at) => (at === level ? { ...row, panels: without(row.panels, panel) } : row)),
    },
  }
}

/** The attempt less the row that the path names; null when the path names none. */
function withoutWhat(path: string, attempt: Attempt): Attempt | null {
  const [, scheme] = /^schemes\.(\d+)/.exec(path) ?? []
  if (scheme !== undefined) {
    const { file, origin } = attempt
    return {
      file: { ...file, schemes: without(file.schemes, Number(scheme)) },
      origin: { ...origin, schemes: without(origin.schemes, Number(scheme)) },
    }
  }
  const [, level, panel] = /^levels\.(\d+)(?:\.panels\.(\d+))?/.exec(path) ?? []
  if (level === undefined) return null
  return panel === undefined ? withoutLevel(attempt, Number(level)) : withoutPanel(attempt, Number(level), Number(panel))
}

/**
 * Appraises what stands: a row that the engine refuses is left out, its reason kept, and the rest is appraised again,
 * so that one half-typed panel does not blank the sheet.
 */
export function appraiseWhatStands(
  appraise: (file: AppraisalFile) => FullAppraisal,
  file: AppraisalFile,
  origin: FileOrigin,
): { full: FullAppraisal | null; problems: ApiIssue[] } {
  const problems: ApiIssue[] = []
  let attempt: Attempt | null = { file, origin }
  while (attempt !== null && attempt.file.levels.length > 0 && attempt.file.schemes.length > 0) {
    try {
      return { full: appraise(attempt.file), problems }
    } catch (cause) {
      if (!(cause instanceof OutOfScopeError)) throw cause
      problems.push({ path: pathInSheet(cause.path, attempt.origin), message: cause.expected })
      attempt = withoutWhat(cause.path, attempt)
    }
  }
  return { full: null, problems }
}
