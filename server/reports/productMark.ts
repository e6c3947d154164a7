import { type Markup, trustedMarkup } from './markup'

/** The sign of the product: a panel that spans both ways, one arrow passing over the other. */
export const PRODUCT_MARK: Markup = trustedMarkup(
  '<svg width="36" height="36" viewBox="0 0 36 36" aria-hidden="true" focusable="false">' +
    '<rect x="1" y="1" width="34" height="34" fill="none" stroke="currentColor" stroke-width="1.5"/>' +
    '<g fill="none" stroke="currentColor" stroke-width="1.5"><path d="M18 6V14.5M18 21.5V30"/><path d="M6 18H30"/></g>' +
    '<g fill="currentColor"><path d="M18 4l3 5h-6zM18 32l-3-5h6zM4 18l5-3v6zM32 18l-5 3v-6z"/></g></svg>',
)
