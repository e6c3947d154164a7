import { mount } from '@vue/test-utils'
import { afterEach, describe, expect, it } from 'vitest'
import { edge } from '../../../shared/contracts/appraisal'
import PanelEdgeFields from '../../../src/components/panel/PanelEdgeFields.vue'
import { byRole, type } from '../../support/screen'

const NAME = 'Edge 2, right'

function shown(input: Parameters<typeof edge.parse>[0]) {
  const props = { edge: edge.parse(input), name: NAME, behind: ['P2', 'P3'] }
  return mount(PanelEdgeFields, { props, attachTo: document.body })
}
const choice = () => document.querySelector<HTMLSelectElement>(`select[aria-label='${NAME}, what goes on behind']`)!

function choose(value: string): void {
  choice().value = value
  choice().dispatchEvent(new Event('change'))
}

describe('what goes on behind an edge', () => {
  afterEach(() => (document.body.innerHTML = ''))

  it('is asked of continuous edges, with the panels that stand there', () => {
    const wrapper = shown({ supportWidth: 250, continuity: 'continuous' })
    expect([...choice().options].map(({ text }) => text)).toEqual([
      'goes on as drawn',
      'goes on for',
      'goes on in P2',
      'goes on in P3',
    ])
    choose('P3')
    choose('a span typed')
    expect(wrapper.emitted('change')).toEqual([[{ beyond: { panel: 'P3' } }], [{ beyond: { span: 5000 } }]])
  })

  it('takes the span that is typed, and is left to the plan again', () => {
    const wrapper = shown({ supportWidth: 250, continuity: 'continuous', beyond: { span: 6000 } })
    type(byRole('textbox', `${NAME}, span that goes on behind, mm`), '5,400')
    choose('as drawn')
    expect(wrapper.emitted('change')).toEqual([[{ beyond: { span: 5400 } }], [{ beyond: undefined }]])
  })

  it('is not asked of other edges', () => {
    shown({ supportWidth: 250, continuity: 'discontinuous' })
    expect(document.querySelectorAll('select')).toHaveLength(2)
  })
})
