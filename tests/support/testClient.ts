import type { Express } from 'express'
import request from 'supertest'
import type { z } from 'zod'
import { apiError, type ApiError } from '../../shared/contracts/apiError'

export type Method = 'get' | 'post' | 'put' | 'delete'

export interface Sent {
  readonly body?: unknown
  readonly headers?: Readonly<Record<string, string>>
  readonly version?: number
  readonly key?: string
}

export interface Answer {
  readonly status: number
  readonly headers: Readonly<Record<string, string>>
  readonly body: unknown
  /** The body by its contract. */
  as<T extends z.ZodType>(schema: T): z.infer<T>
  /** The body as the one shape of errors. */
  readonly error: ApiError
}

/** Calls the application as a signed-in person's browser would; `cookie` absent: as nobody. */
export class TestClient {
  constructor(
    private readonly app: Express,
    private readonly cookie?: string,
  ) {}

  async call(method: Method, path: string, { body, headers = {}, version, key }: Sent = {}): Promise<Answer> {
    const call = request(this.app)[method](path)
    if (this.cookie !== undefined) void call.set('Cookie', this.cookie)
    if (version !== undefined) void call.set('If-Match', `"${version}"`)
    if (key !== undefined) void call.set('Idempotency-Key', key)
    for (const [name, value] of Object.entries(headers)) void call.set(name, value)
    if (body !== undefined) void call.send(body as object)
    const response = await call
    const answer: unknown = response.type === 'application/json' ? response.body : response.text
    return {
      status: response.status,
      headers: response.headers as Record<string, string>,
      body: answer,
      as: (schema) => schema.parse(answer),
      get error() {
        return apiError.parse(answer)
      },
    }
  }

  get = (path: string, sent?: Sent) => this.call('get', path, sent)
  post = (path: string, body: unknown = {}, sent?: Omit<Sent, 'body'>) => this.call('post', path, { ...sent, body })
  put = (path: string, body: unknown, version?: number, sent?: Sent) =>
    this.call('put', path, { ...sent, body, ...(version === undefined ? {} : { version }) })
  delete = (path: string, version?: number) => this.call('delete', path, version === undefined ? {} : { version })
}
