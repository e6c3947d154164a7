import { once } from 'node:events'
import { Agent, createServer, request, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { makePerson, PASSWORD, signedIn } from '../support/factories'
import { openTestServer, type TestServer } from '../support/testServer'

let server: TestServer
let listening: Server
let connections = 0
beforeAll(async () => {
  server = await openTestServer()
  listening = createServer(server.app).on('connection', () => (connections += 1))
  listening.listen(0, '127.0.0.1')
  await once(listening, 'listening')
})
afterAll(async () => {
  listening.close()
  await server.close()
})

/** Status of a request for a new password over a connection of `agent`. */
async function askOnce(agent: Agent, email: string): Promise<number | undefined> {
  const { port } = listening.address() as AddressInfo
  const headers = { 'Content-Type': 'application/json' }
  const asked = request({ agent, port, method: 'POST', path: '/api/password-resets', headers })
  asked.end(JSON.stringify({ email }))
  const [answer] = (await once(asked, 'response')) as [NodeJS.ReadableStream & { statusCode?: number }]
  answer.resume()
  await once(answer, 'end')
  return answer.statusCode
}

describe('asking for a new password again and again over one connection', () => {
  it('keeps the connection for a known address as for an unknown one, also when no more mail is sent', async () => {
    const { firmId } = await signedIn(server, 'admin')
    const { email } = await makePerson(server, firmId, ['surveyor'], { password: PASSWORD })
    for (const address of ['nobody.at.all@example.test', email]) {
      const agent = new Agent({ keepAlive: true, maxSockets: 1 })
      const before = connections
      for (let run = 0; run < 8; run++) {
        expect(await askOnce(agent, address)).toBe(202)
        // what is done after the answer has its time
        await new Promise((resolve) => setTimeout(resolve, 150))
      }
      expect(connections - before, address).toBe(1)
      agent.destroy()
    }
  })
})
