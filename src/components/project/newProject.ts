import { markups } from '#shared/contracts/appraisal'
import { factors } from '#shared/contracts/factors'
import type { ProjectInput, UseCategory } from '#shared/contracts/project'
import { useOf } from '../brief/useCategories'

export interface NewProject {
  readonly name: string
  readonly reference: string
  readonly place: string
  readonly use: UseCategory
  readonly editionId: string | null
}

/**
 * A project as it starts, everything editable in its brief. Imposed load by the use; the rest are starting values in common use.
 *
 * Source: common practice, no source
 */
export function newProjectInput({ name, reference, place, use, editionId }: NewProject): ProjectInput {
  return {
    name,
    reference,
    place,
    use,
    editionId,
    brief: {
      basis: 'EN1992',
      imposedLoad: useOf(use).recommendedKnPerM2,
      finishesLoad: 1.2,
      servicesLoad: 0,
      partitionsLoad: 0.8,
      cover: 25,
      fireMinutes: 60,
      redistribution: 0,
      stockLength: 12_000,
      fck: 25,
      fyk: 500,
      nationalValues: {},
    },
    markups: markups.parse({}),
    measurement: 'comparing',
    scope: [],
    factors: factors.parse({}),
  }
}
