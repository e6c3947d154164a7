import type { Gang, Quotation, Resource } from '#shared/contracts/resource'

/** What is being made or changed; null inside: a new one. */
export type ResourceInHand =
  | { readonly what: 'resource'; readonly resource: Resource | null }
  | { readonly what: 'gang'; readonly gang: Gang | null; readonly members: readonly Resource[] }
  | { readonly what: 'quotation'; readonly resource: Resource; readonly quotation: Quotation | null }
