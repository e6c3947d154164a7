import type { ApiIssue } from '../contracts/apiError'
import type { Gang, Resource, ResourceKind } from '../contracts/resource'

export type PricedResource = Pick<Resource, 'kind' | 'description' | 'unit' | 'price'>
export type PricedGang = Pick<Gang, 'description' | 'members'>

/** Resources and gangs of an edition by their codes: at least those that a build-up names. */
export interface BuildUpPrices {
  readonly resources: ReadonlyMap<string, PricedResource>
  readonly gangs: ReadonlyMap<string, PricedGang>
}

const KIND_IN_WORDS: Readonly<Record<ResourceKind, string>> = { material: 'a material', labour: 'labour', plant: 'plant' }

/** Looks up what a line names; what is not there, or is of another kind, is noted under its path. */
export class BuildUpLookup {
  readonly issues: ApiIssue[] = []

  constructor(private readonly prices: BuildUpPrices) {}

  resource(code: string, kind: ResourceKind, path: string): PricedResource | null {
    const found = this.prices.resources.get(code)
    if (found?.kind === kind) return found
    const reason = found === undefined ? 'the edition has no such resource' : `it is ${KIND_IN_WORDS[found.kind]}`
    this.issues.push({ path, message: `expected the code of ${wanted(kind)}, got ${JSON.stringify(code)}: ${reason}` })
    return null
  }

  gang(code: string, path: string): PricedGang | null {
    const found = this.prices.gangs.get(code)
    if (found !== undefined) return found
    this.issues.push({
      path,
      message: `expected the code of a gang, got ${JSON.stringify(code)}: the edition has no such gang`,
    })
    return null
  }
}

const wanted = (kind: ResourceKind) => (kind === 'material' ? 'a material' : `a ${kind} resource`)
