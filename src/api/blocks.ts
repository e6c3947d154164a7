import { z } from 'zod'
import type { BlockInput, CatalogueBlock } from '#shared/contracts/blockCatalogue'
import { catalogueBlock } from '#shared/contracts/blockCatalogue'
import { command, request } from './http'

export const listBlocks = (): Promise<CatalogueBlock[]> => request(z.array(catalogueBlock), 'GET', '/api/blocks')

export const createBlock = (input: BlockInput, idempotencyKey: string): Promise<CatalogueBlock> =>
  request(catalogueBlock, 'POST', '/api/blocks', { body: input, idempotencyKey })

export const changeBlock = (id: string, version: number, input: BlockInput): Promise<CatalogueBlock> =>
  request(catalogueBlock, 'PUT', `/api/blocks/${id}`, { body: input, version })

export const removeBlock = (id: string, version: number): Promise<void> => command('DELETE', `/api/blocks/${id}`, { version })
