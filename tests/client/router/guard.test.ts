import { createPinia, setActivePinia } from 'pinia'
import { beforeEach, describe, expect, it } from 'vitest'
import { router } from '../../../src/router'
import { homeOf } from '../../../src/router/homeOf'
import { useSessionStore } from '../../../src/stores/session'
import { fakeApi, failing } from '../../support/fakeApi'
import { aSession, projectId } from '../../support/projectSheetOf'
import type { Role } from '#shared/contracts/person'

/** Where the guards lead, without loading the view. */
async function led(to: string, roles: readonly Role[] | null): Promise<string> {
  useSessionStore().session = roles === null ? null : aSession(...roles)
  await router.push(to)
  return router.currentRoute.value.fullPath
}

describe('router', () => {
  beforeEach(() => {
    setActivePinia(createPinia())
    for (const record of router.getRoutes()) record.components = { default: { render: () => null } }
  })

  it('leads to signing in and keeps where the reader was going', async () => {
    expect(await led(`/projects/${projectId}/bill`, null)).toBe(`/sign-in?next=/projects/${projectId}/bill`)
    expect(await led('/', null)).toBe('/sign-in')
  })

  it.each([
    ['engineer', 'checks'],
    ['developer', 'compare'],
    ['surveyor', 'brief'],
  ] as const)('opens a project for an %s at %s', async (role, sheet) => {
    expect(await led(`/projects/${projectId}`, [role])).toBe(`/projects/${projectId}/${sheet}`)
  })

  it.each([
    ['developer', `/projects/${projectId}/bill`, '/'],
    ['engineer', '/people', '/'],
    ['client', '/rates', '/received'],
    ['admin', '/', '/people'],
    ['estimator', `/projects/${projectId}/brief`, '/'],
  ] as const)('leads an %s away from %s', async (role, to, expected) => {
    expect(await led(to, [role])).toBe(expected)
  })

  it('lets somebody with several roles into each', async () => {
    expect(await led('/people', ['admin', 'client'])).toBe('/people')
    expect(homeOf(['admin', 'client'])).toBe('received')
  })

  it('asks once who is signed in', async () => {
    const { calls } = fakeApi({
      'GET /api/session': () => failing(401, 'unauthenticated'),
      'POST /api/session/refresh': () => failing(401, 'unauthenticated'),
    })
    await router.push('/rates')
    await router.push('/people')
    expect(calls.map(({ path }) => path)).toEqual(['/api/session', '/api/session/refresh'])
  })
})
