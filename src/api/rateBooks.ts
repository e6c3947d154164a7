import { z } from 'zod'
import type {
  DraftInput,
  Edition,
  EditionInput,
  EditionStep,
  EditionWithRates,
  RateBook,
  RateBookInput,
} from '#shared/contracts/rateBook'
import { edition, editionWithRates, rateBook } from '#shared/contracts/rateBook'
import { command, request } from './http'

export const listRateBooks = (): Promise<RateBook[]> => request(z.array(rateBook), 'GET', '/api/rate-books')

export const readEdition = (id: string): Promise<EditionWithRates> => request(editionWithRates, 'GET', `/api/editions/${id}`)

export const createRateBook = (body: RateBookInput, idempotencyKey: string): Promise<RateBook> =>
  request(rateBook, 'POST', '/api/rate-books', { body, idempotencyKey })

export const createDraft = (bookId: string, body: DraftInput, idempotencyKey: string): Promise<Edition> =>
  request(edition, 'POST', `/api/rate-books/${bookId}/editions`, { body, idempotencyKey })

export const changeEdition = (id: string, version: number, body: EditionInput): Promise<Edition> =>
  request(edition, 'PUT', `/api/editions/${id}`, { body, version })

export const takeStep = (id: string, version: number, body: EditionStep): Promise<Edition> =>
  request(edition, 'POST', `/api/editions/${id}/steps`, { body, version })

export const discardDraft = (id: string, version: number): Promise<void> => command('DELETE', `/api/editions/${id}`, { version })
