import { flushPromises } from '@vue/test-utils'
import { afterEach, describe, expect, it, vi } from 'vitest'
import SignInView from '../../../src/views/SignInView.vue'
import { failing, fakeApi } from '../../support/fakeApi'
import { mountView } from '../../support/mountView'
import { aSession } from '../../support/projectSheetOf'
import { byRole, describedBy, type } from '../../support/screen'

async function signIn(email: string, password: string): Promise<void> {
  type(byRole('textbox', 'E-mail address'), email)
  type(byRole('textbox', 'Password'), password)
  byRole('button', 'Sign in').click()
  await flushPromises()
}

describe('SignInView', () => {
  afterEach(() => vi.unstubAllGlobals())

  it('signs in and goes on to where the reader was going', async () => {
    const { calls } = fakeApi({ 'POST /api/session': () => ({ status: 201, json: aSession('surveyor') }) })
    const { router } = await mountView(SignInView, '/view?next=/rates')
    await signIn('Surveyor@Example.test ', 'a long pass phrase')
    expect(calls[0]?.body).toEqual({ email: 'surveyor@example.test', password: 'a long pass phrase' })
    expect(router.currentRoute.value.fullPath).toBe('/rates')
  })

  it.each(['https://elsewhere.example/', '//elsewhere.example', '/\\elsewhere.example'])(
    'does not follow %s out of the house',
    async (next) => {
      fakeApi({ 'POST /api/session': () => ({ status: 201, json: aSession('client') }) })
      const { router } = await mountView(SignInView, `/view?next=${encodeURIComponent(next)}`)
      await signIn('client@example.test', 'a long pass phrase')
      expect(router.currentRoute.value.name).toBe('received')
    },
  )

  it('says the same of an unknown person and a wrong password, and keeps what was typed', async () => {
    fakeApi({ 'POST /api/session': () => failing(401, 'unauthenticated') })
    await mountView(SignInView)
    await signIn('nobody@example.test', 'wrong')
    expect(document.querySelector('[role=alert]')?.textContent).toContain('The e-mail address or the password is not right.')
    expect((byRole('textbox', 'E-mail address') as HTMLInputElement).value).toBe('nobody@example.test')
  })

  it('asks for an address before it asks the server', async () => {
    const { calls } = fakeApi({})
    await mountView(SignInView)
    await signIn('not an address', 'x')
    expect(describedBy(byRole('textbox', 'E-mail address'))).toBe('expected one e-mail address, as name@example.com')
    expect(calls).toEqual([])
  })

  it('says that the session ended', async () => {
    fakeApi({})
    await mountView(SignInView, '/view?ended=1')
    expect(document.body.textContent).toContain('Your session ended.')
  })
})
