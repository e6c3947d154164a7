import type { EditionInput } from '#shared/contracts/rateBook'
import { editionInput } from '#shared/contracts/rateBook'
import { computed, reactive, ref } from 'vue'
import type { ApiFailure } from '../../api/apiFailure'

const EXPECTED: Readonly<Record<keyof EditionInput, string>> = {
  baseDate: 'expected the day that the prices hold for',
  validUntil: 'expected a day, or nothing',
  taxBasis: 'expected one line, as: before tax',
  note: 'expected one line, or nothing',
  holdsOverheads: 'expected yes or no',
}

/** What a compiler states of an edition, as it is typed: read by its contract, with a problem at each field once it was tried. */
export function useEditionForm(from: EditionInput) {
  const typed = reactive({ ...from })
  const isTried = ref(false)
  const reading = computed(() => editionInput.safeParse(typed))
  /** What the contract or the server says against a field. @param prefix - of the field in the body that was sent */
  const problemAt = (field: keyof EditionInput, error: ApiFailure | null, prefix = ''): string | null => {
    const isWrong = isTried.value && reading.value.error?.issues.some(({ path }) => path[0] === field)
    if (isWrong) return EXPECTED[field]
    return error?.issues.find(({ path }) => path === `${prefix}${field}`)?.message ?? null
  }
  return { typed, isTried, reading, problemAt }
}
