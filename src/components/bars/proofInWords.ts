import type { CuttingPlan } from '#shared/schedule/cutting/cuttingPlan'

/** Whether fewer bars could do, in words. */
export function proofInWords({ proof, used, linearBound }: Pick<CuttingPlan, 'proof' | 'used' | 'linearBound'>): string {
  if (proof === 'bound') return 'proven: equals the bound'
  if (proof === 'search') return 'proven: fewer were tried'
  const more = used - Math.ceil(linearBound - 1e-6)
  return `not proven: ${more} above the bound`
}
