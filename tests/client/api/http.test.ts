import { beforeEach, describe, expect, it } from 'vitest'
import { z } from 'zod'
import type { ApiFailure } from '../../../src/api/apiFailure'
import { onUnauthenticated, request } from '../../../src/api/http'
import { failing, fakeApi } from '../../support/fakeApi'

const answer = z.strictObject({ name: z.string() })
const failureOf = (call: Promise<unknown>) =>
  call.then(
    () => null,
    (cause: unknown) => cause as ApiFailure,
  )

describe('request', () => {
  beforeEach(() => onUnauthenticated(() => Promise.resolve(false)))

  it('sends version and idempotency key where they are given', async () => {
    const { calls } = fakeApi({ 'PUT /api/thing': () => ({ status: 200, json: { name: 'a' } }) })
    await request(answer, 'PUT', '/api/thing', { body: { name: 'a' }, version: 3, idempotencyKey: 'key-1' })
    expect(calls[0]?.headers.get('If-Match')).toBe('"3"')
    expect(calls[0]?.headers.get('Idempotency-Key')).toBe('key-1')
    expect(calls[0]?.headers.get('Content-Type')).toBe('application/json')
  })

  it('renews the session once and repeats the call with the same key', async () => {
    let tries = 0
    const { calls } = fakeApi({
      'POST /api/thing': () => (++tries === 1 ? failing(401, 'unauthenticated') : { status: 201, json: { name: 'b' } }),
    })
    onUnauthenticated(() => Promise.resolve(true))
    expect(await request(answer, 'POST', '/api/thing', { body: {}, idempotencyKey: 'key-2' })).toEqual({ name: 'b' })
    expect(calls.map(({ headers }) => headers.get('Idempotency-Key'))).toEqual(['key-2', 'key-2'])
  })

  it('gives up after the second 401', async () => {
    const { calls } = fakeApi({ 'GET /api/thing': () => failing(401, 'unauthenticated') })
    onUnauthenticated(() => Promise.resolve(true))
    expect((await failureOf(request(answer, 'GET', '/api/thing')))?.code).toBe('unauthenticated')
    expect(calls).toHaveLength(2)
  })

  it('carries the issues of a refusal', async () => {
    fakeApi({ 'PUT /api/thing': () => failing(400, 'invalid_request', [{ path: 'name', message: 'expected a name' }]) })
    const failure = await failureOf(request(answer, 'PUT', '/api/thing', { body: {} }))
    expect(failure?.issues).toEqual([{ path: 'name', message: 'expected a name' }])
  })

  it('says unreachable when no answer comes and unreadable when the contract does not know it', async () => {
    fakeApi({ 'GET /api/gone': () => 'no answer', 'GET /api/odd': () => ({ status: 200, json: { nome: 1 } }) })
    expect((await failureOf(request(answer, 'GET', '/api/gone')))?.code).toBe('unreachable')
    expect((await failureOf(request(answer, 'GET', '/api/odd')))?.code).toBe('unreadable')
  })
})
