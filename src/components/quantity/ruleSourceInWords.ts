import type { RuleSource } from '#shared/takeoff/measurementRules'

const WORDS: Readonly<Record<RuleSource, string>> = {
  seen: 'seen in a text',
  memory: 'from memory',
  project: 'our own',
  practice: 'common practice, no source',
}

/** How a rule of measurement is known. */
export function ruleSourceInWords(source: RuleSource): string {
  return WORDS[source]
}
