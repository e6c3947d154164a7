import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { TestClient } from '../support/testClient'
import { openTestServer, type TestServer } from '../support/testServer'

const folder = mkdtempSync(join(tmpdir(), 'bothways-client-'))
let server: TestServer
let browser: TestClient
beforeAll(async () => {
  mkdirSync(join(folder, 'assets'))
  writeFileSync(join(folder, 'index.html'), '<!doctype html><title>Bothways</title>')
  writeFileSync(join(folder, 'favicon.svg'), '<svg xmlns="http://www.w3.org/2000/svg"/>')
  writeFileSync(join(folder, 'assets', 'index-abc123.js'), 'export {}')
  server = await openTestServer({ clientFolder: folder })
  browser = new TestClient(server.app)
})
afterAll(async () => {
  await server.close()
  rmSync(folder, { recursive: true })
})
const page = { headers: { Accept: 'text/html,*/*' } }

describe('the client', () => {
  it.each(['/', '/sign-in', '/projects/01a23016/levels', '/reset'])(
    'is one page at %s, asked for anew each time',
    async (path) => {
      const answer = await browser.get(path, page)
      expect(answer.status).toBe(200)
      expect(answer.body).toContain('<title>Bothways</title>')
      expect(answer.headers['cache-control']).toBe('no-cache')
    },
  )

  it('keeps hashed assets for a year, and answers 404 to one that is not there', async () => {
    const asset = await browser.get('/assets/index-abc123.js')
    expect(asset.headers['cache-control']).toBe('public, max-age=31536000, immutable')
    const missing = await browser.get('/assets/index-gone.js', page)
    expect(missing.status).toBe(404)
    expect(missing.error.code).toBe('not_found')
  })

  it('gives nothing outside its folder', async () => {
    for (const path of ['/assets/..%2f..%2fpackage.json', '/%2e%2e/%2e%2e/etc/passwd', '/assets/%00']) {
      const answer = await browser.get(path)
      expect([200, 400, 404]).toContain(answer.status)
      if (answer.status === 200) expect(answer.body).toContain('<title>Bothways</title>')
    }
  })

  it('is no page to whoever wants JSON', async () => {
    expect((await browser.get('/nothing', { headers: { Accept: 'application/json' } })).error.code).toBe('not_found')
  })

  it('runs under a policy without inline script or style, on plain http without an upgrade', async () => {
    const policy = (await browser.get('/', page)).headers['content-security-policy']!
    expect(policy).not.toContain('unsafe-inline')
    expect(policy).not.toContain('upgrade-insecure-requests')
    for (const rule of [
      "default-src 'none'",
      "script-src 'self'",
      "style-src 'self'",
      "worker-src 'self'",
      "frame-ancestors 'self'",
    ]) {
      expect(policy.split(';')).toContain(rule)
    }
  })

  it('tells nothing about what serves it', async () => {
    const { headers } = await browser.get('/', page)
    expect(headers['x-powered-by']).toBeUndefined()
    expect(headers['server']).toBeUndefined()
    expect(headers['x-content-type-options']).toBe('nosniff')
    expect(headers['referrer-policy']).toBe('no-referrer')
  })
})
