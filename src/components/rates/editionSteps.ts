import type { Edition, EditionState, EditionStep } from '#shared/contracts/rateBook'

export type StepName = EditionStep['step']

/** A step in words; with `reasonLabel` it wants a reason. */
export interface StepInWords {
  readonly label: string
  readonly meaning: string
  readonly from: readonly EditionState[]
  readonly reasonLabel?: string
}

export const STEPS: Readonly<Record<StepName, StepInWords>> = {
  check: {
    label: 'Mark as checked',
    meaning: 'You have read every rate and its source. Nothing in the edition changes any more, unless it goes back.',
    from: ['draft'],
  },
  return: {
    label: 'Return to the compilers',
    meaning: 'The edition is a draft again.',
    from: ['checked'],
    reasonLabel: 'What is to be put right',
  },
  publish: {
    label: 'Publish',
    meaning:
      'Surveyors may price by it from now on. It is fixed for good: a correction is a new edition. The edition published before is superseded; projects that use it keep it until they choose this one.',
    from: ['checked'],
  },
  withdraw: {
    label: 'Withdraw',
    meaning: 'It stays readable and where it is used, marked as withdrawn. This cannot be undone.',
    from: ['published', 'superseded'],
    reasonLabel: 'Why it is withdrawn',
  },
}

/** Steps that an edition is ready for, each with why this reader may not take it, or null. */
export function stepsOf({
  state,
  isOwnWork,
}: Pick<Edition, 'state' | 'isOwnWork'>): { step: StepName; offReason: string | null }[] {
  const names = (Object.keys(STEPS) as StepName[]).filter((name) => STEPS[name].from.includes(state))
  return names.map((step) => {
    const isForOthers = step === 'check' || step === 'publish'
    return {
      step,
      offReason: isForOthers && isOwnWork ? 'You compiled it or changed a price in it: somebody else does this.' : null,
    }
  })
}
