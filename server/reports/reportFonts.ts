import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import { dirname, join } from 'node:path'

const FAMILY = 'Source Sans 3'
const WEIGHTS = [300, 400, 600] as const
const folder = dirname(createRequire(import.meta.url).resolve('@fontsource/source-sans-3/package.json'))

/** Unicode ranges by script, as `U+0000-00FF,U+0131`; Latin last, so that it wins where ranges overlap. */
const RANGES = JSON.parse(readFileSync(join(folder, 'unicode.json'), 'utf8')) as Record<string, string>

function isInRange(codePoint: number, range: string): boolean {
  return range.split(',').some((part) => {
    const [first, last] = part.replace('U+', '').split('-')
    const from = parseInt(first!, 16)
    return codePoint >= from && codePoint <= (last === undefined ? from : parseInt(last, 16))
  })
}

/** Scripts whose font files a text needs; Latin always. */
function scriptsOf(text: string): string[] {
  const codePoints = [...new Set(text)].map((character) => character.codePointAt(0)!)
  return Object.entries(RANGES)
    .filter(([script, range]) => script === 'latin' || codePoints.some((code) => code > 0xff && isInRange(code, range)))
    .map(([script]) => script)
}

const files = new Map<string, string>()

function fontFile(script: string, weight: number): string {
  const name = `source-sans-3-${script}-${weight}-normal.woff2`
  const known = files.get(name) ?? readFileSync(join(folder, 'files', name)).toString('base64')
  files.set(name, known)
  return known
}

/** Font file of a weight, Latin, as it is served. */
export function latinFont(weight: (typeof WEIGHTS)[number]): Buffer {
  return Buffer.from(fontFile('latin', weight), 'base64')
}

/** Style rules that carry the fonts for every character of `text`, so that nothing is fetched. */
export function embeddedFonts(text: string): string {
  return scriptsOf(text)
    .flatMap((script) =>
      WEIGHTS.map(
        (weight) =>
          `@font-face{font-family:'${FAMILY}';font-weight:${weight};src:url(data:font/woff2;base64,${fontFile(script, weight)}) format('woff2');unicode-range:${RANGES[script]}}`,
      ),
    )
    .join('\n')
}
