import { scopeEntry, type ScopeBasis, type ScopeEntry } from '../contracts/sameScope'

/** An entry of the same-scope list in the words of the trade. */
export interface ScopeWords {
  /** As inside a sentence: 'plaster or ceiling'. */
  readonly name: string
  /** What the entry asks about. */
  readonly hint: string
}

/**
 * The same-scope list: what one scheme may need, or need more of, and a comparison forgets.
 *
 * Source: project rule, engine design section 5 (same scope); common practice, no source
 */
export const SCOPE_WORDS: Readonly<Record<ScopeEntry, ScopeWords>> = {
  ceiling: { name: 'plaster or ceiling', hint: 'Blocks need one below; a fair-faced slab may be painted.' },
  floorFinish: { name: 'floor finish for sound', hint: 'No bare slab of either kind is quiet underfoot.' },
  storeyHeight: { name: 'storey height and cladding', hint: 'The deeper floor makes every storey, stair and façade taller.' },
  ribbedConcrete: {
    name: 'dearer ribbed concrete',
    hint: 'Small aggregate, pump and slow placing between blocks.',
  },
  groutLost: { name: 'grout lost into blocks', hint: 'Past open or cracked ends and through joints.' },
  deck: { name: 'full or open deck', hint: 'Blocks on a full deck, or on boards under the ribs only.' },
  propping: { name: 'propping weeks and height', hint: 'Longer hire, or props over the usual height.' },
  hoisting: { name: 'hoisting', hint: 'Blocks, bars and concrete up to each floor.' },
  leastGang: { name: 'least gang', hint: 'Small pours that keep a whole gang waiting.' },
  lineLoads: { name: 'line loads', hint: 'Walls along ribs ask for doubled ribs.' },
  trimmingBars: { name: 'trimming bars', hint: 'At openings made later; those beside drawn voids are measured.' },
  tiesChairsLinks: { name: 'ties, chairs and links', hint: 'What holds the bars in their place.' },
  loadDirection: { name: 'direction of load on beams', hint: 'Ribs load two of the four beams; a two-way slab loads all.' },
}

/** What a declared rate is per. */
export const BASIS_WORDS: Readonly<Record<ScopeBasis, string>> = {
  grossArea: 'm² of gross floor',
  concrete: 'm³ of concrete',
  blocks: 'block',
  steel: 't of bars and mesh',
  sum: 'sum for all floors',
}

/** Every entry in the order of the list. */
export const SCOPE_ENTRIES: readonly ScopeEntry[] = scopeEntry.options

/** The entry at the head of a row or a line: 'Plaster or ceiling'. */
export function scopeTitle(entry: ScopeEntry): string {
  const { name } = SCOPE_WORDS[entry]
  return name.charAt(0).toUpperCase() + name.slice(1)
}
