/** What jsdom lacks and the client uses: told once for all client tests. */
import { vi } from 'vitest'

class StillObserver implements ResizeObserver {
  observe(): void {}
  unobserve(): void {}
  disconnect(): void {}
}

vi.stubGlobal('ResizeObserver', StillObserver)
vi.stubGlobal('matchMedia', (media: string): MediaQueryList => {
  const target = new EventTarget()
  return Object.assign(target, {
    media,
    matches: false,
    onchange: null,
    addListener: () => {},
    removeListener: () => {},
  })
})
window.scrollTo = () => {}
Element.prototype.scrollIntoView = () => {}
