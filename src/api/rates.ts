import type { ItemCode } from '#shared/contracts/appraisal'
import type { OpenedRate } from '#shared/contracts/openedRate'
import { openedRate } from '#shared/contracts/openedRate'
import type { Rate, RateInput } from '#shared/contracts/rateBook'
import { rate } from '#shared/contracts/rateBook'
import { command, request } from './http'

const addressOf = (editionId: string, item: ItemCode) => `/api/editions/${editionId}/rates/${item}`

/** A rate with what it is built up from; `block`: code of the resource that stands for a scheme's own block. */
export const readOpenedRate = (editionId: string, item: ItemCode, block?: string): Promise<OpenedRate> =>
  request(
    openedRate,
    'GET',
    `/api/editions/${editionId}/build-up/${item}${block === undefined ? '' : `?block=${encodeURIComponent(block)}`}`,
  )

export const createRate = (editionId: string, item: ItemCode, input: RateInput, idempotencyKey: string): Promise<Rate> =>
  request(rate, 'POST', addressOf(editionId, item), { body: input, idempotencyKey })

export const changeRate = (editionId: string, item: ItemCode, version: number, input: RateInput): Promise<Rate> =>
  request(rate, 'PUT', addressOf(editionId, item), { body: input, version })

export const removeRate = (editionId: string, item: ItemCode, version: number): Promise<void> =>
  command('DELETE', addressOf(editionId, item), { version })
