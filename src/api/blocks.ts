import { z } from 'zod'
import type { CatalogueBlock } from '#shared/contracts/blockCatalogue'
import { catalogueBlock } from '#shared/contracts/blockCatalogue'
import { request } from './http'

export const listBlocks = (): Promise<CatalogueBlock[]> => request(z.array(catalogueBlock), 'GET', '/api/blocks')
