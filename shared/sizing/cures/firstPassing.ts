/**
 * First of some trials that passes, looked for in growing strides and then closed in on: the trial before it, if any, fails. A
 * window of passing trials narrower than a stride may be passed over. Null where none of those looked at passes.
 *
 * Source: project rule; bisection between a trial that fails and one that passes
 */
export function firstPassing<Trial>(trials: readonly Trial[], passes: (trial: Trial) => boolean): Trial | null {
  let failing = -1
  for (let stride = 1; failing < trials.length - 1; stride *= 2) {
    const at = Math.min(failing + stride, trials.length - 1)
    if (passes(trials[at]!)) return closedIn(trials, passes, failing, at)
    failing = at
  }
  return null
}

function closedIn<Trial>(trials: readonly Trial[], passes: (trial: Trial) => boolean, failing: number, passing: number): Trial {
  let [low, high] = [failing, passing]
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2)
    if (passes(trials[middle]!)) high = middle
    else low = middle
  }
  return trials[high]!
}
