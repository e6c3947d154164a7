import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { notLikeForLike, scopeDifferences, undeclaredCount } from '#shared/alsoCompared/scopeDifferences'
import { SCOPE_ENTRIES, SCOPE_WORDS } from '#shared/alsoCompared/scopeWords'
import type { ScopeStanding } from '#shared/contracts/sameScope'

type State = ScopeStanding['state'] | null
const states = fc.array(
  fc.tuple(
    fc.constantFrom<State>('priced', 'inRates', 'leftOut', null),
    fc.constantFrom<State>('priced', 'inRates', 'leftOut', null),
  ),
  {
    minLength: SCOPE_ENTRIES.length,
    maxLength: SCOPE_ENTRIES.length,
  },
)

/** Standings of R1 and S1, one pair of states for each entry of the list; null: nothing declared. */
function standingsOf(pairs: readonly (readonly [State, State])[]): ScopeStanding[] {
  return SCOPE_ENTRIES.flatMap((entry, index) =>
    (['R1', 'S1'] as const).flatMap((scheme, side): ScopeStanding[] => {
      const state = pairs[index]![side] ?? null
      return state === null ? [] : [{ scheme, entry, state, note: '' }]
    }),
  )
}

const holds = (state: State) => state === 'priced' || state === 'inRates'

describe('scope differences', () => {
  it('flag an entry exactly where one total holds it and the other does not', () => {
    fc.assert(
      fc.property(states, (pairs) => {
        const unequal = scopeDifferences(standingsOf(pairs), ['R1', 'S1']).filter(({ isUnequal }) => isUnequal)
        const expected = SCOPE_ENTRIES.filter((_, index) => holds(pairs[index]![0]) !== holds(pairs[index]![1]))
        expect(unequal.map(({ entry }) => entry)).toEqual(expected)
      }),
    )
  })

  it('name softly what is not declared and not known to differ', () => {
    fc.assert(
      fc.property(states, (pairs) => {
        const differences = scopeDifferences(standingsOf(pairs), ['R1', 'S1'])
        const soft = pairs.filter(([a, b]) => (a === null || b === null) && holds(a) === holds(b))
        expect(undeclaredCount(differences)).toBe(soft.length)
      }),
    )
  })

  it('are the same from either side', () => {
    fc.assert(
      fc.property(states, (pairs) => {
        const key = ({ entry, isUnequal }: { entry: string; isUnequal: boolean }) => `${entry} ${isUnequal}`
        const there = scopeDifferences(standingsOf(pairs), ['R1', 'S1']).map(key)
        expect(scopeDifferences(standingsOf(pairs), ['S1', 'R1']).map(key)).toEqual(there)
      }),
    )
  })

  it('are said in one sentence that names every unequal entry and both schemes, and in none where nothing differs', () => {
    fc.assert(
      fc.property(states, (pairs) => {
        const differences = scopeDifferences(standingsOf(pairs), ['R1', 'S1'])
        const sentence = notLikeForLike(differences)
        const unequal = differences.filter(({ isUnequal }) => isUnequal)
        expect(sentence === '').toBe(unequal.length === 0)
        for (const { entry } of unequal) expect(sentence).toContain(SCOPE_WORDS[entry].name)
      }),
    )
  })

  it('take entries together that differ alike', () => {
    const standings: ScopeStanding[] = [
      { scheme: 'R1', entry: 'ceiling', state: 'priced', note: '' },
      { scheme: 'S1', entry: 'ceiling', state: 'leftOut', note: 'painted' },
      { scheme: 'R1', entry: 'hoisting', state: 'priced', note: '' },
      { scheme: 'S1', entry: 'hoisting', state: 'leftOut', note: 'crane is there' },
      { scheme: 'S1', entry: 'deck', state: 'inRates', note: '' },
    ]
    expect(notLikeForLike(scopeDifferences(standings, ['R1', 'S1']))).toBe(
      'Not like for like in plaster or ceiling and hoisting: priced for R1, left out for S1; in full or open deck: not declared for R1, in the rates for S1',
    )
  })
})
