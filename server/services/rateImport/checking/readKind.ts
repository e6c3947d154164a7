import type { ResourceKind } from '#shared/contracts/resource'

const WORDS: Readonly<Record<ResourceKind, readonly string[]>> = {
  material: ['material', 'materials', 'mat', 'm', 'materiale', 'materiau'],
  labour: ['labour', 'labor', 'lab', 'l', 'wages', 'lohn'],
  plant: ['plant', 'equipment', 'machine', 'machinery', 'p', 'hire', 'gerat'],
}

/** Kind of a resource by the word in a list; null where it is none. */
export function readKind(text: string): ResourceKind | null {
  const word = text.normalize('NFD').replace(/\p{M}/gu, '').toLowerCase().trim()
  return (Object.keys(WORDS) as ResourceKind[]).find((kind) => WORDS[kind].includes(word)) ?? null
}
