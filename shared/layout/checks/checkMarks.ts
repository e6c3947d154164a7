import type { ApiIssue } from '../../contracts/apiError'
import type { AppraisalFile } from '../../contracts/appraisal'

/** Marks used twice: of levels, of schemes, of panels in their level. */
export function checkMarks({ levels, schemes }: Pick<AppraisalFile, 'levels' | 'schemes'>): ApiIssue[] {
  return [
    ...repeated(levels, 'levels', 'level'),
    ...levels.flatMap(({ panels, mark }, i) => repeated(panels, `levels.${i}.panels`, `panel of level ${mark}`)),
    ...repeated(schemes, 'schemes', 'scheme'),
  ]
}

function repeated(marked: readonly { readonly mark: string }[], path: string, name: string): ApiIssue[] {
  const seen = new Set<string>()
  return marked.flatMap(({ mark }, i) => {
    if (seen.has(mark))
      return [{ path: `${path}.${i}.mark`, message: `${mark} is used already: expected every ${name} to have its own mark` }]
    seen.add(mark)
    return []
  })
}
