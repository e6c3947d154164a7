import { allScopeDifferences } from '#shared/alsoCompared/scopeDifferences'
import type { ApiIssue } from '#shared/contracts/apiError'
import type { LevelInput, ProjectInput, ProjectSheet, SchemeInput, StoredLevel, StoredScheme } from '#shared/contracts/project'
import type { ItemCode } from '#shared/contracts/appraisal'
import type { EditionWithRates } from '#shared/contracts/rateBook'
import type { RateOverride } from '#shared/contracts/rateOverride'
import type { ProjectReading } from '#shared/contracts/projectReading'
import { defineStore } from 'pinia'
import { computed, shallowRef } from 'vue'
import { idempotencyKey } from '../api/idempotencyKey'
import { createLevel, removeLevel as askToRemoveLevel } from '../api/levels'
import { readProjectReading, readProjectSheet } from '../api/projects'
import { readEdition } from '../api/rateBooks'
import { createScheme, removeScheme as askToRemoveScheme } from '../api/schemes'
import type { FullAppraisal } from '#shared/appraise'
import type { AppraisalSource } from './appraisalFile'
import { useSessionStore } from './session'
import { createSheetAppraisal } from './sheetAppraisal'
import { followMarks } from './followMarks'
import { followSchemeMark } from './followSchemeMark'
import type { SheetRow } from './sheetRow'
import { levelInputOf, schemeInputOf, withoutRow, withRow } from './sheetRow'
import { createSheetSaving } from './sheetSaving'

/**
 * The open project. A surveyor has a working copy (`sheet`), changed at once, appraised in the browser and saved after a pause;
 * a developer or an engineer reads what the server appraised (`reading`). `project`, `levels`, `schemes`, `edition` and `full`
 * serve both, `file` is what was appraised here.
 */
export const useProjectStore = defineStore('project', () => {
  const session = useSessionStore()
  const sheet = shallowRef<ProjectSheet | null>(null)
  const reading = shallowRef<ProjectReading | null>(null)
  /** The edition that this project was priced by before another was chosen here; null: none was, or it was seen. */
  const formerEdition = shallowRef<EditionWithRates | null>(null)
  const source = (): AppraisalSource | null => sheet.value ?? (reading.value && { ...reading.value, edition: null })
  const appraisal = createSheetAppraisal(source)
  const saving = createSheetSaving(sheet)

  const project = computed(() => sheet.value?.project ?? reading.value?.project ?? null)
  const levels = computed<readonly StoredLevel[]>(() => sheet.value?.levels ?? reading.value?.levels ?? [])
  const schemes = computed<readonly StoredScheme[]>(() => sheet.value?.schemes ?? reading.value?.schemes ?? [])
  const edition = computed(() => sheet.value?.edition ?? reading.value?.edition ?? null)
  const full = computed<FullAppraisal | null>(() =>
    reading.value === null
      ? appraisal.full.value
      : {
          sized: [],
          problems: [],
          alsoCompared: [],
          ...appraisal.full.value,
          appraisal: reading.value.appraisal,
          scopeDifferences: allScopeDifferences(reading.value.scope, reading.value.appraisal.schemes),
        },
  )
  const problems = computed<readonly ApiIssue[]>(() => {
    const all = [...appraisal.problems.value, ...saving.refusals.value]
    return all.filter(({ path, message }, at) => all.findIndex((one) => one.path === path && one.message === message) === at)
  })

  /** Loads the project as the signed-in person may see it. @throws ApiFailure */
  async function open(projectId: string): Promise<void> {
    await saving.queue.flush()
    close()
    if (session.hasRole('surveyor')) sheet.value = await readProjectSheet(projectId)
    else reading.value = await readProjectReading(projectId)
    appraisal.schedule(0)
  }

  function close(): void {
    saving.reset()
    appraisal.reset()
    sheet.value = null
    formerEdition.value = null
    reading.value = null
  }

  function change(row: SheetRow): void {
    if (sheet.value === null) return
    sheet.value = withRow(sheet.value, row)
    saving.touch(row)
    appraisal.schedule()
  }

  /** Changes brief, edition or markups; another edition's rates are fetched first. @throws ApiFailure */
  async function changeProject(input: ProjectInput): Promise<void> {
    if (sheet.value === null) return
    change({ kind: 'project', row: { ...sheet.value.project, ...input } })
    if (input.editionId === (sheet.value.edition?.id ?? null)) return
    const other = input.editionId === null ? null : await readEdition(input.editionId)
    if (sheet.value.project.editionId !== input.editionId) return
    formerEdition.value = other === null || sheet.value.edition?.id === other.id ? null : sheet.value.edition
    sheet.value = { ...sheet.value, edition: other }
    appraisal.schedule()
  }

  /** Takes in a rate of the project's own that was stored, or lifted (null). */
  function putOverride(item: ItemCode, override: RateOverride | null): void {
    if (sheet.value === null) return
    const others = sheet.value.overrides.filter((each) => each.item !== item)
    sheet.value = { ...sheet.value, overrides: override === null ? others : [...others, override] }
    appraisal.schedule()
  }

  function changeLevel(levelId: string, input: LevelInput): void {
    const row = sheet.value?.levels.find(({ id }) => id === levelId)
    if (row === undefined || sheet.value === null) return
    change({ kind: 'level', row: { ...row, ...input } })
    for (const scheme of followMarks(sheet.value.schemes, row, input)) change({ kind: 'scheme', row: scheme })
  }

  function changeScheme(schemeId: string, input: SchemeInput): void {
    const row = sheet.value?.schemes.find(({ id }) => id === schemeId)
    if (row === undefined) return
    change({ kind: 'scheme', row: { ...row, ...input } })
    followScheme(row.specification.mark, input.specification.mark)
  }

  /** What is declared of a scheme follows it to its new mark, or goes with it. */
  function followScheme(before: string, now: string | null): void {
    if (sheet.value === null) return
    const scope = followSchemeMark(sheet.value.project.scope, before, now)
    if (scope !== null) change({ kind: 'project', row: { ...sheet.value.project, scope } })
  }

  /** @throws ApiFailure */
  async function addLevel(input: LevelInput): Promise<StoredLevel | null> {
    if (sheet.value === null) return null
    const row = await createLevel(sheet.value.project.id, input, idempotencyKey())
    sheet.value = { ...sheet.value, levels: [...sheet.value.levels, row] }
    appraisal.schedule()
    return row
  }

  /** @throws ApiFailure */
  async function addScheme(input: SchemeInput): Promise<StoredScheme | null> {
    if (sheet.value === null) return null
    const row = await createScheme(sheet.value.project.id, input, idempotencyKey())
    sheet.value = { ...sheet.value, schemes: [...sheet.value.schemes, row] }
    appraisal.schedule()
    return row
  }

  /** Takes the row out once what was typed in it is stored, so that its version is the newest. @throws ApiFailure */
  async function remove(key: string, ask: (projectId: string, version: number) => Promise<void>): Promise<void> {
    await saving.queue.flush()
    const rows = [...(sheet.value?.levels ?? []), ...(sheet.value?.schemes ?? [])]
    const row = rows.find(({ id }) => key.endsWith(`:${id}`))
    if (sheet.value === null || row === undefined) return
    await ask(sheet.value.project.id, row.version)
    saving.forget(key)
    sheet.value = withoutRow(sheet.value, key)
    appraisal.schedule()
  }

  const removeLevel = (id: string) => remove(`level:${id}`, (projectId, version) => askToRemoveLevel(projectId, id, version))
  async function removeScheme(id: string): Promise<void> {
    const row = sheet.value?.schemes.find((each) => each.id === id)
    await remove(`scheme:${id}`, (projectId, version) => askToRemoveScheme(projectId, id, version))
    if (row !== undefined) followScheme(row.specification.mark, null)
  }

  /** Of a conflict: stores my version over theirs. @throws ApiFailure */
  async function keepMine(): Promise<void> {
    if (saving.conflict.value === null) return
    const anew = saving.keepMine(saving.conflict.value)
    if (anew?.kind === 'level') await addLevel(levelInputOf(anew.row))
    if (anew?.kind === 'scheme') await addScheme(schemeInputOf(anew.row))
    appraisal.schedule()
  }

  /** Of a conflict: leaves mine and goes on from theirs. @throws ApiFailure */
  async function takeTheirs(): Promise<void> {
    if (saving.conflict.value === null || sheet.value === null) return
    saving.takeTheirs(saving.conflict.value)
    const { editionId } = sheet.value.project
    if (editionId !== (sheet.value.edition?.id ?? null))
      sheet.value = { ...sheet.value, edition: editionId === null ? null : await readEdition(editionId) }
    appraisal.schedule()
  }

  return {
    sheet,
    reading,
    project,
    levels,
    schemes,
    edition,
    formerEdition,
    full,
    file: appraisal.file,
    problems,
    isAppraising: appraisal.isAppraising,
    fault: appraisal.fault,
    saving: saving.queue.state,
    savedAt: saving.queue.savedAt,
    saveFailure: saving.failure,
    conflict: saving.conflict,
    open,
    close,
    flush: saving.queue.flush,
    changeProject,
    putOverride,
    changeLevel,
    addLevel,
    removeLevel,
    changeScheme,
    addScheme,
    removeScheme,
    keepMine,
    takeTheirs,
  }
})
