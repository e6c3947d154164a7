import type { Measurement } from '#shared/contracts/measurement'
import { type DifferenceReason, type RuleDifference, ruleDifferences } from '#shared/takeoff/ruleDifferences'
import { RULE_SETS } from '#shared/takeoff/ruleSets'
import type { Ref } from 'vue'
import { computed } from 'vue'
import { useProjectStore } from '../../stores/project'
import { projectInputOf } from '../../stores/sheetRow'
import { formatQuantity } from '../base/formatQuantity'
import type { Pair } from '../compare/phrase'
import { itemInSentence } from './itemInWords'

const REASONS: Readonly<Record<DifferenceReason, string>> = {
  voids: 'small voids left in',
  laps: 'laps of mesh',
  deepEdges: 'deep edges by area',
  rounding: 'rounding',
}

/** The rules that the open project is measured by, what they change, and their choice. */
export function useRules(marks: Ref<Pair<string> | null>) {
  const store = useProjectStore()
  const rules = computed(() => RULE_SETS[store.file?.measurement ?? store.project?.measurement ?? 'comparing'])

  function differencesOf(mark: string): string[] {
    const { file, full } = store
    const scheme = file?.schemes.find((each) => each.mark === mark)
    const sized = full?.sized.find((each) => each.mark === mark)
    if (!file || !scheme || !sized || store.isAppraising) return []
    return ruleDifferences(scheme, sized, file.levels, rules.value, file.brief.basis).map(inWords)
  }
  const differences = computed(() =>
    marks.value === null || rules.value.code === 'comparing'
      ? null
      : { ribbed: differencesOf(marks.value.ribbed), solid: differencesOf(marks.value.solid) },
  )

  async function choose(measurement: Measurement): Promise<void> {
    const project = store.sheet?.project
    if (project) await store.changeProject({ ...projectInputOf(project), measurement })
  }
  return { rules, differences, choose }
}

function inWords({ item, unit, reason, difference }: RuleDifference): string {
  const decimals = unit === 't' ? 4 : 3
  return `${itemInSentence(item)} ${formatQuantity(difference, { decimals, isSigned: true })} ${unit}, ${REASONS[reason]}`
}
