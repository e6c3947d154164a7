import type { Person } from '#shared/contracts/person'
import { flushPromises } from '@vue/test-utils'
import { afterEach, describe, expect, it, vi } from 'vitest'
import PeopleView from '../../../src/views/PeopleView.vue'
import { failing, fakeApi } from '../../support/fakeApi'
import { mountView } from '../../support/mountView'
import { personId } from '../../support/projectSheetOf'
import { byRole, type } from '../../support/screen'

const person: Person = {
  id: personId,
  name: 'Estimator One',
  email: 'one@example.test',
  roles: ['estimator'],
  state: 'active',
  version: 3,
  createdAt: '2026-03-01T00:00:00.000Z',
}
const list = () => ({ status: 200, json: [person] })

describe('PeopleView', () => {
  afterEach(() => vi.unstubAllGlobals())

  it('invites somebody with the roles that were ticked', async () => {
    const invited = { ...person, id: '00000000-0000-4000-8000-000000000099', email: 'new@example.test', state: 'invited' }
    const { calls } = fakeApi({ 'GET /api/people': list, 'POST /api/people': () => ({ status: 201, json: invited }) })
    await mountView(PeopleView)
    type(byRole('textbox', 'Name'), 'New Person')
    type(byRole('textbox', 'E-mail address'), 'new@example.test')
    byRole('button', 'Send the invitation').click()
    await flushPromises()
    expect(document.body.textContent).toContain('expected at least one role')
    byRole('checkbox', 'engineer').click()
    await flushPromises()
    byRole('button', 'Send the invitation').click()
    await flushPromises()
    const posts = calls.filter(({ method }) => method === 'POST')
    expect(posts.map(({ body }) => body)).toEqual([{ name: 'New Person', email: 'new@example.test', roles: ['engineer'] }])
    expect(byRole('row', /new@example\.test/).textContent).toContain('invited, no password yet')
  })

  it('changes roles over the version it has seen', async () => {
    const { calls } = fakeApi({
      'GET /api/people': list,
      [`PUT /api/people/${personId}`]: ({ body }) => ({ status: 200, json: { ...person, ...(body as object), version: 4 } }),
    })
    await mountView(PeopleView)
    byRole('button', 'Change Estimator One').click()
    await flushPromises()
    const dialog = document.querySelector('[role=dialog]')!
    const boxes = [...dialog.querySelectorAll<HTMLInputElement>('input[type=checkbox]')]
    boxes[0]!.click()
    boxes.at(-1)!.click()
    await flushPromises()
    byRole('button', 'Set').click()
    await flushPromises()
    const put = calls.find(({ method }) => method === 'PUT')
    expect(put?.headers.get('If-Match')).toBe('"3"')
    expect(put?.body).toEqual({ roles: ['surveyor', 'estimator'], state: 'off' })
    expect(byRole('row', /Estimator One/).textContent).toContain('may not sign in')
  })

  it('says why a change was refused', async () => {
    fakeApi({
      'GET /api/people': list,
      [`PUT /api/people/${personId}`]: () => failing(409, 'conflict'),
    })
    await mountView(PeopleView)
    byRole('button', 'Change Estimator One').click()
    await flushPromises()
    byRole('button', 'Set').click()
    await flushPromises()
    expect(document.querySelector('[role=dialog] [role=alert]')?.textContent).toContain('refused with conflict')
  })
})
