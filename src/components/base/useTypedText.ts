import type { Ref } from 'vue'
import { computed, ref, watch } from 'vue'

/** The value a text stands for, or what was expected instead. */
export type Reading<T> = { readonly value: T } | { readonly expected: string }

/**
 * Keeps what was typed until it can be read: the model changes only with a text that reads well, and a text that does not
 * stays as typed, with what was expected. At rest the text is written as the model says.
 */
export function useTypedText<T>(model: Ref<T>, read: (text: string) => Reading<T>, write: (value: T) => string) {
  const text = ref(write(model.value))
  const isTyping = ref(false)
  const reading = computed(() => read(text.value))
  const expected = computed(() => ('expected' in reading.value ? reading.value.expected : null))

  watch(model, (value) => {
    if (!('value' in reading.value) || reading.value.value !== value) text.value = write(value)
    else if (!isTyping.value) text.value = write(value)
  })

  function type(next: string): void {
    text.value = next
    if ('value' in reading.value && reading.value.value !== model.value) model.value = reading.value.value
  }

  function rest(): void {
    isTyping.value = false
    if ('value' in reading.value) text.value = write(model.value)
  }

  return { text, expected, isTyping, type, rest }
}
