import { flushPromises } from '@vue/test-utils'
import { afterEach, describe, expect, it, vi } from 'vitest'
import InvitationView from '../../../src/views/InvitationView.vue'
import PasswordResetView from '../../../src/views/PasswordResetView.vue'
import { failing, fakeApi } from '../../support/fakeApi'
import { mountView } from '../../support/mountView'
import { byRole, describedBy, type } from '../../support/screen'

const token = 'a'.repeat(43)

describe('PasswordResetView', () => {
  afterEach(() => vi.unstubAllGlobals())

  it('answers the same for any address', async () => {
    const { calls } = fakeApi({ 'POST /api/password-resets': () => ({ status: 202 }) })
    await mountView(PasswordResetView)
    type(byRole('textbox', 'E-mail address'), 'nobody@example.test')
    byRole('button', 'Send the link').click()
    await flushPromises()
    expect(calls[0]?.body).toEqual({ email: 'nobody@example.test' })
    expect(document.body.textContent).toContain('If the address belongs to somebody here')
  })

  it('asks for 15 characters before it asks the server, then sends the token from behind the #', async () => {
    const { calls } = fakeApi({ 'POST /api/password-resets/redeem': () => ({ status: 204 }) })
    await mountView(PasswordResetView, `/view#${token}`)
    type(byRole('textbox', 'New password'), 'too short')
    byRole('button', 'Set the password').click()
    await flushPromises()
    expect(describedBy(byRole('textbox', 'New password'))).toBe('expected at least 15 characters')
    type(byRole('textbox', 'New password'), 'four plain words here')
    byRole('button', 'Set the password').click()
    await flushPromises()
    expect(calls.map(({ body }) => body)).toEqual([{ token, password: 'four plain words here' }])
    expect(byRole('heading', 'The password is set').tagName).toBe('H1')
  })

  it('shows at the field why a password was refused', async () => {
    const refused = [{ path: 'password', message: 'expected a password that is not a common one' }]
    fakeApi({ 'POST /api/password-resets/redeem': () => failing(400, 'invalid_request', refused) })
    await mountView(PasswordResetView, `/view#${token}`)
    type(byRole('textbox', 'New password'), 'passwordpassword')
    byRole('button', 'Set the password').click()
    await flushPromises()
    expect(describedBy(byRole('textbox', 'New password'))).toBe('expected a password that is not a common one')
  })
})

describe('InvitationView', () => {
  it('sends name and password with the token', async () => {
    const { calls } = fakeApi({ 'POST /api/invitations/redeem': () => ({ status: 204 }) })
    await mountView(InvitationView, `/view#${token}`)
    type(byRole('textbox', 'Your name'), ' An Engineer ')
    type(byRole('textbox', 'New password'), 'four plain words here')
    byRole('button', 'Accept the invitation').click()
    await flushPromises()
    expect(calls[0]?.body).toEqual({ token, name: 'An Engineer', password: 'four plain words here' })
  })

  it('says when the link is not whole', async () => {
    await mountView(InvitationView)
    expect(document.querySelector('[role=alert]')?.textContent).toContain('Open the whole link')
  })
})
