/** Finds controls as a reader does: by role and name, in the document. */

function nameOf(element: Element): string {
  const labelled = element.getAttribute('aria-labelledby')
  if (labelled !== null)
    return labelled
      .split(' ')
      .map((id) => document.getElementById(id)?.textContent ?? '')
      .join(' ')
      .trim()
  const spoken = element.getAttribute('aria-label')
  if (spoken !== null) return spoken
  const label = element.id === '' ? null : document.querySelector(`label[for="${element.id}"]`)
  return (label ?? element.closest('label') ?? element).textContent.trim().replace(/\s+/g, ' ')
}

const ROLES: Record<string, string> = {
  button: 'button, [role="button"]',
  textbox: 'input:not([type=checkbox]):not([type=radio]), textarea',
  combobox: '[role="combobox"]',
  checkbox: 'input[type=checkbox]',
  link: 'a[href]',
  heading: 'h1, h2, h3',
  row: 'tr',
}

export type ScreenRole = 'button' | 'textbox' | 'combobox' | 'checkbox' | 'link' | 'heading' | 'row'

export function allByRole(role: ScreenRole, name?: string | RegExp): HTMLElement[] {
  return [...document.querySelectorAll<HTMLElement>(ROLES[role]!)].filter((element) => {
    const own = nameOf(element)
    return name === undefined || (typeof name === 'string' ? own === name : name.test(own))
  })
}

/** @throws when there is not exactly one */
export function byRole(role: ScreenRole, name: string | RegExp): HTMLElement {
  const found = allByRole(role, name)
  if (found.length === 1) return found[0]!
  const there = allByRole(role).map((element) => `"${nameOf(element)}"`)
  throw new Error(`${found.length} of role ${role} named ${String(name)}; there are: ${there.join(', ')}`)
}

export function type(element: HTMLElement, text: string): void {
  const input = element as HTMLInputElement
  input.focus()
  input.value = text
  input.dispatchEvent(new Event('input', { bubbles: true }))
}

/** What a field says is wrong or worth knowing. */
export function describedBy(element: HTMLElement): string {
  const id = element.getAttribute('aria-describedby')
  return id === null ? '' : (document.getElementById(id)?.textContent ?? '')
}
