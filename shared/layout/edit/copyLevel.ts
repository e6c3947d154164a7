import type { Level } from '../../contracts/appraisal'
import { nextMark } from './nextMark'

/** A level's copy under the next free mark, not repeated: repeats belong to the level that stands for several floors. */
export function copyLevel<L extends Level & { readonly name: string }>(level: L, marks: readonly string[]): L {
  const mark = nextMark([...marks.filter((each) => each !== level.mark), level.mark], 'L1')
  return { ...level, mark, name: `${level.name}, copy`, repeat: 1 }
}
