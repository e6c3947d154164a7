import type { LevelInput } from '#shared/contracts/project'
import { AppError } from '../../errors'

/** @throws AppError `invalid_request` naming every panel that cannot be built as drawn */
export function requireSoundFloor({ panels }: LevelInput): void {
  const issues = panels.flatMap(({ mark }, index) =>
    panels.findIndex((panel) => panel.mark === mark) < index
      ? [{ path: `panels.${index}.mark`, message: 'expected a mark that no other panel of the level has' }]
      : [],
  )
  if (issues.length > 0) throw new AppError('invalid_request', undefined, issues)
}
