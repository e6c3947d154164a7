import { makeFirm, makePerson, PASSWORD } from './factories'
import { TestClient, type Answer } from './testClient'
import type { TestServer } from './testServer'

/** Cookies that an answer sets, by name. */
export function cookiesOf({ headers }: Answer): Map<string, string> {
  const lines = headers['set-cookie'] as unknown as string[]
  return new Map(lines.map((line) => [line.slice(0, line.indexOf('=')), line.slice(line.indexOf('=') + 1, line.indexOf(';'))]))
}

export const cookieHeader = (answer: Answer) => [...cookiesOf(answer)].map(([name, value]) => `${name}=${value}`).join('; ')

/** A surveyor of a new firm, who signs in by password. */
export async function signInSomebody(server: TestServer) {
  const firmId = await makeFirm(server)
  const person = await makePerson(server, firmId, ['surveyor'], { password: PASSWORD })
  const answer = await new TestClient(server.app).post('/api/session', { email: person.email, password: PASSWORD })
  return { firmId, person, answer }
}
