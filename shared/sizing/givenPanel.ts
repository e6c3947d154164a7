/** An entry of a scheme that holds for one panel. */
interface OfPanel {
  readonly level: string
  readonly panel: string
}

/**
 * What a scheme gives one panel by itself, undefined where it gives nothing.
 *
 * Source: project rule, an engineer's bars take the place of computed ones panel by panel
 */
export function givenFor<Given extends OfPanel>(given: readonly Given[], level: string, panel: string): Given | undefined {
  return given.find((each) => each.level === level && each.panel === panel)
}
