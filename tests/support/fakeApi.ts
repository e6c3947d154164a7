import { vi } from 'vitest'

export interface ApiCall {
  readonly method: string
  readonly path: string
  readonly headers: Headers
  readonly body: unknown
}

/** What the fake server answers: a status with its JSON, or nothing at all. */
export type ApiAnswer = { readonly status: number; readonly json?: unknown } | 'no answer'
type Answerer = (call: ApiCall) => ApiAnswer | Promise<ApiAnswer>

/**
 * Puts a server in place of `fetch`: answers by `METHOD path`, and keeps every call. An address without an answer fails the test.
 */
export function fakeApi(answers: Record<string, Answerer>): {
  readonly calls: ApiCall[]
  readonly answers: Record<string, Answerer>
} {
  const calls: ApiCall[] = []
  vi.stubGlobal('fetch', async (path: string, { method = 'GET', headers, body }: RequestInit = {}) => {
    const call = {
      method,
      path,
      headers: new Headers(headers),
      body: typeof body === 'string' ? (JSON.parse(body) as unknown) : undefined,
    }
    calls.push(call)
    const answerer = answers[`${method} ${path}`]
    if (answerer === undefined) throw new Error(`the fake server has no answer to ${method} ${path}`)
    const answer = await answerer(call)
    if (answer === 'no answer') throw new TypeError('Failed to fetch')
    return new Response(answer.json === undefined ? null : JSON.stringify(answer.json), { status: answer.status })
  })
  return { calls, answers }
}

/** An error body as the contract has it. */
export function failing(status: number, code: string, issues?: readonly { path: string; message: string }[]): ApiAnswer {
  const json = { code, message: `refused with ${code}`, requestId: 'request-1', ...(issues === undefined ? {} : { issues }) }
  return { status, json }
}
