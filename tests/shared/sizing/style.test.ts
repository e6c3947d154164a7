import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'

const ROOT = 'shared/sizing'
const FILES = readdirSync(ROOT, { recursive: true, encoding: 'utf8' }).filter((name) => name.endsWith('.ts'))

/** Exported functions of a file with the docstring in front of each, empty where there is none. */
function exportedFunctions(text: string): { name: string; docstring: string }[] {
  return [...text.matchAll(/(\/\*\*(?:(?!\*\/)[\s\S])*\*\/\n)?export function (\w+)/g)].map(([, docstring, name]) => ({
    name: name!,
    docstring: docstring ?? '',
  }))
}

describe('sizing', () => {
  it.each(FILES)('%s names the source of every exported function', (file) => {
    const unsourced = exportedFunctions(readFileSync(join(ROOT, file), 'utf8')).filter(
      ({ docstring }) => (docstring.match(/Source: \S/g) ?? []).length !== 1,
    )
    expect(unsourced.map(({ name }) => name)).toEqual([])
  })

  it('finds functions without a docstring, so that the test above can fail', () => {
    expect(exportedFunctions('export function bare() {}\n')).toEqual([{ name: 'bare', docstring: '' }])
  })
})
