/** Says on stderr what is being done and how long it took; stdout is left to results. */
export async function step(what, work) {
  process.stderr.write(`${what} …\n`)
  const begun = Date.now()
  const result = await work()
  process.stderr.write(`${what}: ${((Date.now() - begun) / 1000).toFixed(1)} s\n`)
  return result
}

/** A failure the caller can do something about: shown without a stack. */
export class SetUpError extends Error {}
