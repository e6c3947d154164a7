import type { ResourceKind } from '#shared/contracts/resource'

/** A layer of a rate's section: its share of the whole, by the kind of what it is made of. */
export interface RateLayer {
  readonly kind: ResourceKind | 'on top'
  readonly name: string
  /** Of 1, for drawing only. */
  readonly share: number
  /** Of 1, from the bottom. */
  readonly from: number
}

interface Drawn {
  readonly lines: readonly { readonly kind: ResourceKind; readonly name: string; readonly likely: string }[]
  readonly overheads: { readonly likely: string }
  readonly profit: { readonly likely: string }
}

/** The layers of a built-up rate from the bottom up: its lines as they come, then overheads and profit. Empty for a rate of nothing. */
export function buildUpLayers({ lines, overheads, profit }: Drawn): RateLayer[] {
  const onTop = Number(overheads.likely) + Number(profit.likely)
  const amounts = [
    ...lines.map(({ kind, name, likely }) => ({ kind, name, amount: Number(likely) })),
    { kind: 'on top' as const, name: 'overheads and profit', amount: onTop },
  ].filter(({ amount }) => amount > 0)
  const whole = amounts.reduce((sum, { amount }) => sum + amount, 0)
  let from = 0
  return amounts.map(({ kind, name, amount }) => {
    const layer = { kind, name, share: amount / whole, from }
    from += amount / whole
    return layer
  })
}
