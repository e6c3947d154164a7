import type { RateMove } from '#shared/contracts/resource'
import { readableIssues } from '#shared/readableIssues'
import type { Ref } from 'vue'
import { computed, ref, shallowRef, toRaw, watch } from 'vue'
import type { z } from 'zod'
import type { ApiFailure } from '../../api/apiFailure'
import { idempotencyKey } from '../../api/idempotencyKey'
import { useTask } from '../../composables/useTask'

/** What a form of prices works on: how it is checked, looked at beforehand and stored. */
export interface PriceFormWork<Input, Stored extends { readonly version: number }> {
  readonly schema: z.ZodType<Input>
  /** What the form begins with. */
  readonly begin: Input
  /** Version that stands stored; null: it is new. */
  readonly version: number | null
  readonly toInput: (stored: Stored) => Input
  /** As it stands stored now; null: somebody removed it. */
  readonly readNow: () => Promise<Stored | null>
  /** Which rates would move; absent: none can. */
  readonly preview?: (input: Input) => Promise<RateMove[]>
  readonly create: (input: Input, key: string) => Promise<Stored>
  readonly change: (version: number, input: Input) => Promise<Stored>
  readonly onSaved: (stored: Stored) => void
}

/**
 * A form of prices in a draft, from the first letter to the stored row: problems at their fields once it was tried; before saving, the
 * rates that move; and where somebody else saved meanwhile, both versions, with nothing typed lost.
 */
export function usePriceForm<Input, Stored extends { readonly version: number }>(work: PriceFormWork<Input, Stored>) {
  const draft = ref(structuredClone(work.begin)) as Ref<Input>
  const version = ref(work.version)
  const isTried = ref(false)
  /** Fields whose text no value can hold, as letters for a count; nothing is saved while there are any. */
  const unreadable = ref(new Set<string>())
  const moves = shallowRef<readonly RateMove[] | null>(null)
  const theirs = shallowRef<{ readonly stored: Stored | null } | null>(null)
  let key = idempotencyKey()

  const reading = computed(() => work.schema.safeParse(draft.value))
  const problems = computed(() =>
    isTried.value && !reading.value.success ? readableIssues(reading.value.error.issues, toRaw(draft.value)) : [],
  )

  const store = async (input: Input) =>
    version.value === null ? await work.create(input, key) : await work.change(version.value, input)

  const saving = useTask(async (isSeen: boolean) => {
    isTried.value = true
    if (!reading.value.success || unreadable.value.size > 0) return
    const input = reading.value.data
    if (!isSeen && version.value !== null && work.preview) {
      moves.value = await work.preview(input)
      if (moves.value.length > 0) return
    }
    work.onSaved(await store(input))
    key = idempotencyKey()
    moves.value = null
  })
  const fetching = useTask(async () => {
    theirs.value = { stored: await work.readNow() }
  })

  async function save(isSeen: boolean): Promise<void> {
    await saving.run(isSeen)
    if (saving.error.value?.code === 'stale') await fetching.run()
  }
  function change(): void {
    key = idempotencyKey()
    moves.value = null
    saving.error.value = null
  }
  watch(draft, change, { deep: true })
  /** Goes on with what was typed here, over what the other stored. */
  async function keepMine(): Promise<void> {
    version.value = theirs.value?.stored?.version ?? null
    theirs.value = null
    moves.value = null
    await save(false)
  }
  function takeTheirs(): void {
    const stored = theirs.value?.stored
    if (stored) {
      draft.value = structuredClone(work.toInput(stored))
      version.value = stored.version
    }
    theirs.value = null
  }

  const error = computed<ApiFailure | null>(() => {
    const failure = saving.error.value?.code === 'stale' ? null : saving.error.value
    return failure ?? fetching.error.value
  })
  /** What is wrong with a field: by the contract, or as the server said. */
  function problemOf(path: string): string | null {
    const said = [...problems.value, ...(saving.error.value?.issues ?? [])].find((issue) => issue.path === path)
    return said?.message.replace(/, got ""$/, '') ?? null
  }

  function noteWrong(path: string, expected: string | null): void {
    if (expected === null) unreadable.value.delete(path)
    else unreadable.value.add(path)
  }

  return {
    draft,
    moves,
    error,
    problemOf,
    isBusy: computed(() => saving.running.value || fetching.running.value),
    isWrong: computed(() => problems.value.length > 0 || (isTried.value && unreadable.value.size > 0)),
    noteWrong,
    conflict: computed(() => {
      if (theirs.value === null) return null
      const { stored } = theirs.value
      return { mine: draft.value as unknown, theirs: stored === null ? null : (work.toInput(stored) as unknown) }
    }),
    save,
    keepMine,
    takeTheirs,
  }
}
export type PriceForm = Pick<
  ReturnType<typeof usePriceForm>,
  'moves' | 'error' | 'isBusy' | 'isWrong' | 'conflict' | 'save' | 'keepMine' | 'takeTheirs'
>
