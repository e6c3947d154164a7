import type { ApiIssue } from '#shared/contracts/apiError'
import type { ProjectSheet } from '#shared/contracts/project'
import type { ShallowRef } from 'vue'
import { computed, shallowRef } from 'vue'
import { ApiFailure } from '../api/apiFailure'
import { readProjectSheet } from '../api/projects'
import type { SaveOutcome } from './savingQueue'
import { createSavingQueue } from './savingQueue'
import type { SheetRow } from './sheetRow'
import { atVersion, issuesInSheet, keyOf, rowOf, sendRow, withoutRow, withRow } from './sheetRow'

/** Somebody else stored this row in the meantime. `theirs` is null where they removed it. */
export interface SheetConflict {
  readonly key: string
  readonly mine: SheetRow
  readonly theirs: SheetRow | null
}

/** Saves the rows of a working copy: versions, refusals by path, conflicts with both versions kept. */
export function createSheetSaving(sheet: ShallowRef<ProjectSheet | null>) {
  const refusals = shallowRef<ReadonlyMap<string, readonly ApiIssue[]>>(new Map())
  const conflicts = shallowRef<readonly SheetConflict[]>([])
  const failure = shallowRef<ApiFailure | null>(null)
  const queue = createSavingQueue(save)

  function refuse(key: string, issues: readonly ApiIssue[]): void {
    const next = new Map(refusals.value)
    if (issues.length === 0) next.delete(key)
    else next.set(key, issues)
    refusals.value = next
  }

  /** Takes the stored row in, keeping what was typed while it was under way. */
  function takeStored(key: string, sent: SheetRow, stored: SheetRow): void {
    if (sheet.value === null) return
    const now = rowOf(sheet.value, key)
    if (now === undefined) return
    sheet.value = withRow(sheet.value, now.row === sent.row ? stored : atVersion(now, stored.row.version))
  }

  async function meetConflict(key: string, mine: SheetRow): Promise<SaveOutcome> {
    if (sheet.value === null) return 'saved'
    const stored = await readProjectSheet(sheet.value.project.id)
    const theirs = rowOf(stored, key) ?? null
    conflicts.value = [...conflicts.value.filter((other) => other.key !== key), { key, mine, theirs }]
    return 'conflict'
  }

  async function outcomeOf(cause: unknown, key: string, sent: SheetRow): Promise<SaveOutcome> {
    if (!(cause instanceof ApiFailure) || sheet.value === null) throw cause
    failure.value = cause
    if (cause.code === 'stale' || (cause.code === 'not_found' && sent.kind !== 'project')) return await meetConflict(key, sent)
    if (cause.code !== 'invalid_request' && cause.code !== 'out_of_scope' && cause.code !== 'conflict') return 'failed'
    const issues = cause.issues.length > 0 ? cause.issues : [{ path: 'mark', message: cause.message }]
    refuse(key, issuesInSheet(sheet.value, sent, issues))
    return 'refused'
  }

  async function save(key: string, isLeaving: boolean): Promise<SaveOutcome> {
    const sent = sheet.value === null ? undefined : rowOf(sheet.value, key)
    if (sheet.value === null || sent === undefined) return 'saved'
    try {
      takeStored(key, sent, await sendRow(sheet.value.project.id, sent, isLeaving))
      failure.value = null
      return 'saved'
    } catch (cause) {
      try {
        return await outcomeOf(cause, key, sent)
      } catch (second) {
        if (second instanceof ApiFailure) return 'failed'
        throw second
      }
    }
  }

  function touch(row: SheetRow): void {
    refuse(keyOf(row), [])
    queue.touch(keyOf(row))
  }

  function endConflict(key: string): void {
    conflicts.value = conflicts.value.filter((other) => other.key !== key)
    queue.settle(key)
  }

  /** Stores mine over theirs. Yields the row to be made anew where they removed it. */
  function keepMine({ key, theirs }: SheetConflict): SheetRow | null {
    if (sheet.value === null) return null
    const mine = rowOf(sheet.value, key)
    endConflict(key)
    if (mine === undefined) return null
    if (theirs === null) {
      sheet.value = withoutRow(sheet.value, key)
      return mine
    }
    const rebased = atVersion(mine, theirs.row.version)
    sheet.value = withRow(sheet.value, rebased)
    queue.touch(key)
    return null
  }

  function takeTheirs({ key, theirs }: SheetConflict): void {
    if (sheet.value === null) return
    endConflict(key)
    refuse(key, [])
    sheet.value = theirs === null ? withoutRow(sheet.value, key) : withRow(sheet.value, theirs)
  }

  function reset(): void {
    queue.reset()
    refusals.value = new Map()
    conflicts.value = []
    failure.value = null
  }

  return {
    queue,
    refusals: computed(() => [...refusals.value.values()].flat()),
    conflict: computed(() => conflicts.value[0] ?? null),
    failure,
    touch,
    forget: (key: string) => (refuse(key, []), endConflict(key)),
    keepMine,
    takeTheirs,
    reset,
  }
}
