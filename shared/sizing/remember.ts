/**
 * A function that works out the answer for each key once. The memory lives as long as what this returns, never longer than one call of
 * the engine.
 *
 * Source: project rule, identical panels are sized once
 */
export function remember<Answer>(): (key: string, work: () => Answer) => Answer {
  const known = new Map<string, { readonly answer: Answer }>()
  return (key, work) => {
    const found = known.get(key) ?? { answer: work() }
    known.set(key, found)
    return found.answer
  }
}
