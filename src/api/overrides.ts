import type { ItemCode } from '#shared/contracts/appraisal'
import type { RateOverride, RateOverrideInput } from '#shared/contracts/rateOverride'
import { rateOverride } from '#shared/contracts/rateOverride'
import { command, request } from './http'

const addressOf = (projectId: string, item: ItemCode) => `/api/projects/${projectId}/overrides/${item}`

export const createOverride = (
  projectId: string,
  item: ItemCode,
  input: RateOverrideInput,
  idempotencyKey: string,
): Promise<RateOverride> => request(rateOverride, 'POST', addressOf(projectId, item), { body: input, idempotencyKey })

export const changeOverride = (
  projectId: string,
  item: ItemCode,
  version: number,
  input: RateOverrideInput,
): Promise<RateOverride> => request(rateOverride, 'PUT', addressOf(projectId, item), { body: input, version })

export const removeOverride = (projectId: string, item: ItemCode, version: number): Promise<void> =>
  command('DELETE', addressOf(projectId, item), { version })
