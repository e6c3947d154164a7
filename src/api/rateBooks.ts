import { z } from 'zod'
import type { EditionWithRates, RateBook } from '#shared/contracts/rateBook'
import { editionWithRates, rateBook } from '#shared/contracts/rateBook'
import { request } from './http'

export const listRateBooks = (): Promise<RateBook[]> => request(z.array(rateBook), 'GET', '/api/rate-books')

export const readEdition = (id: string): Promise<EditionWithRates> => request(editionWithRates, 'GET', `/api/editions/${id}`)
