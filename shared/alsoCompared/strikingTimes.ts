/** Days that formwork stays under a slab after it is concreted. */
export interface StrikingTimes {
  readonly soffitDays: number
  readonly propDays: number
  /** As 't ≥ 16 °C: soffit 4, props 10 days'. */
  readonly working: string
}

/** Mean temperature from which the fixed numbers of days hold, °C. */
const WARM = 16

/**
 * Least time before soffit formwork and props are struck, for screening; what is struck, and when, is the engineer's word.
 *
 * Source: BS 8110-1:1997, Table 6.2, ordinary Portland cement (seen as quoted): soffit 4 days or 100/(t + 10), props 10 days or
 * 250/(t + 10)
 * @param temperature - mean of the air, °C, above 0
 */
export function strikingTimes(temperature: number): StrikingTimes {
  if (temperature >= WARM) return { soffitDays: 4, propDays: 10, working: `t = ${temperature} °C: soffit 4 days, props 10 days` }
  const [soffitDays, propDays] = [100 / (temperature + 10), 250 / (temperature + 10)]
  const days = (value: number) => value.toFixed(1)
  return {
    soffitDays,
    propDays,
    working: `t = ${temperature} °C: soffit 100/(t + 10) = ${days(soffitDays)} days, props 250/(t + 10) = ${days(propDays)} days`,
  }
}
