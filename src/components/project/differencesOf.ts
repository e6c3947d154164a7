export interface Difference {
  /** As 'panels.2.outline.1.0'. */
  readonly path: string
  readonly mine: string
  readonly theirs: string
}

const isBranch = (value: unknown): value is Record<string, unknown> => typeof value === 'object' && value !== null
const written = (value: unknown): string =>
  value === undefined ? 'absent' : isBranch(value) ? JSON.stringify(value) : String(value)
const UNTOLD = ['id', 'version', 'position', 'updatedAt', 'updatedBy']

/** What two versions of a row do not share, leaf by leaf, the version itself left out. */
export function differencesOf(mine: unknown, theirs: unknown, path: readonly string[] = []): Difference[] {
  if (mine === theirs) return []
  if (!isBranch(mine) || !isBranch(theirs)) return [{ path: path.join('.'), mine: written(mine), theirs: written(theirs) }]
  const keys = [...new Set([...Object.keys(mine), ...Object.keys(theirs)])]
  return keys
    .filter((key) => path.length > 0 || !UNTOLD.includes(key))
    .flatMap((key) => differencesOf(mine[key], theirs[key], [...path, key]))
}
