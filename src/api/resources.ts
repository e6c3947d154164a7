import { z } from 'zod'
import type {
  Gang,
  GangInput,
  Quotation,
  QuotationInput,
  RateMove,
  Resource,
  ResourceInput,
  ResourceKind,
} from '#shared/contracts/resource'
import { gang, quotation, rateMove, resource } from '#shared/contracts/resource'
import type { ResourcePage, ResourceSheet } from '#shared/contracts/resourceSheet'
import { resourcePage, resourceSheet } from '#shared/contracts/resourceSheet'
import { command, request } from './http'

/** What is asked for of a list of resources. */
export interface AskedResources {
  readonly search: string
  readonly kind: ResourceKind | null
  readonly page: number
}

const moves = z.array(rateMove)
const addressOf = (editionId: string, kind: 'resources' | 'gangs' | 'quotations', code = ''): string =>
  `/api/editions/${editionId}/${kind}${code === '' ? '' : `/${encodeURIComponent(code)}`}`

export function listResources(editionId: string, { search, kind, page }: AskedResources): Promise<ResourcePage> {
  const asked = new URLSearchParams({ search, page: String(page), ...(kind === null ? {} : { kind }) })
  return request(resourcePage, 'GET', `${addressOf(editionId, 'resources')}?${asked.toString()}`)
}

export const readResource = (editionId: string, code: string): Promise<ResourceSheet> =>
  request(resourceSheet, 'GET', addressOf(editionId, 'resources', code))

export const createResource = (editionId: string, input: ResourceInput, idempotencyKey: string): Promise<Resource> =>
  request(resource, 'POST', addressOf(editionId, 'resources'), { body: input, idempotencyKey })

export const changeResource = (editionId: string, version: number, input: ResourceInput): Promise<Resource> =>
  request(resource, 'PUT', addressOf(editionId, 'resources', input.code), { body: input, version })

export const removeResource = (editionId: string, code: string, version: number): Promise<void> =>
  command('DELETE', addressOf(editionId, 'resources', code), { version })

/** Which rates the change would move, and by how much; nothing is saved. */
export const previewResource = (editionId: string, input: ResourceInput): Promise<RateMove[]> =>
  request(moves, 'POST', `${addressOf(editionId, 'resources', input.code)}/preview`, { body: input })

/** Chooses the quotation that a resource takes its price from; null: none. */
export const chooseQuotation = (editionId: string, code: string, version: number, id: string | null): Promise<ResourceSheet> =>
  request(resourceSheet, 'PUT', `${addressOf(editionId, 'resources', code)}/choice`, { body: { quotation: id }, version })

export const previewChoice = (editionId: string, code: string, id: string | null): Promise<RateMove[]> =>
  request(moves, 'POST', `${addressOf(editionId, 'resources', code)}/choice/preview`, { body: { quotation: id } })

export const listGangs = (editionId: string): Promise<Gang[]> => request(z.array(gang), 'GET', addressOf(editionId, 'gangs'))

export const createGang = (editionId: string, input: GangInput, idempotencyKey: string): Promise<Gang> =>
  request(gang, 'POST', addressOf(editionId, 'gangs'), { body: input, idempotencyKey })

export const changeGang = (editionId: string, version: number, input: GangInput): Promise<Gang> =>
  request(gang, 'PUT', addressOf(editionId, 'gangs', input.code), { body: input, version })

export const removeGang = (editionId: string, code: string, version: number): Promise<void> =>
  command('DELETE', addressOf(editionId, 'gangs', code), { version })

export const previewGang = (editionId: string, input: GangInput): Promise<RateMove[]> =>
  request(moves, 'POST', `${addressOf(editionId, 'gangs', input.code)}/preview`, { body: input })

export const createQuotation = (editionId: string, input: QuotationInput, idempotencyKey: string): Promise<Quotation> =>
  request(quotation, 'POST', addressOf(editionId, 'quotations'), { body: input, idempotencyKey })

export const changeQuotation = (editionId: string, id: string, version: number, input: QuotationInput): Promise<Quotation> =>
  request(quotation, 'PUT', addressOf(editionId, 'quotations', id), { body: input, version })

export const removeQuotation = (editionId: string, id: string, version: number): Promise<void> =>
  command('DELETE', addressOf(editionId, 'quotations', id), { version })
