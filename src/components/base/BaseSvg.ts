import type { SvgNode } from '#shared/drawing/svgNode'
import type { PropType, VNode } from 'vue'
import { defineComponent, h } from 'vue'

function toVNode({ tag, attributes, children }: SvgNode): VNode {
  return h(
    tag,
    { ...attributes },
    children.map((child) => (typeof child === 'string' ? child : toVNode(child))),
  )
}

/** A drawing of the engine as live SVG. `label` says in words what it shows; without one it is decoration. */
export const BaseSvg = defineComponent({
  name: 'BaseSvg',
  props: {
    node: { type: Object as PropType<SvgNode>, required: true },
    label: { type: String, default: undefined },
  },
  setup: (props) => () => {
    const drawing = toVNode(props.node)
    const spoken = props.label === undefined ? { 'aria-hidden': 'true' } : { role: 'img', 'aria-label': props.label }
    return h(drawing, { class: 'drawing', ...spoken })
  },
})
