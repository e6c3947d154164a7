import { useMediaQuery, useStorage } from '@vueuse/core'
import { computed, watchEffect } from 'vue'

export type Theme = 'system' | 'light' | 'dark'

const choice = useStorage<Theme>('bothways.theme', 'system')

/** Light, dark or as the system says; `html` carries the class `dark` or `light`. */
export function useTheme() {
  const systemIsDark = useMediaQuery('(prefers-color-scheme: dark)')
  const isDark = computed(() => choice.value === 'dark' || (choice.value === 'system' && systemIsDark.value))
  watchEffect(() => {
    document.documentElement.classList.toggle('dark', isDark.value)
    document.documentElement.classList.toggle('light', !isDark.value)
  })
  return { theme: choice, isDark }
}
