import { readdirSync, readFileSync } from 'node:fs'
import { dirname, extname, join } from 'node:path'
import { describe, expect, it } from 'vitest'

/**
 * What each layer may import: its own files, files under `may`, and at run time the `packages` ('*' = any).
 * A file belongs to the layer with the longest matching prefix.
 */
const ENGINE = ['shared/contracts', 'shared/units', 'shared/outOfScope', 'shared/geometry']
const LAYERS: Record<string, { may: string[]; packages: string[] }> = {
  shared: { may: ['shared'], packages: [] },
  'shared/contracts': { may: [], packages: ['zod'] },
  'shared/geometry': { may: ['shared/contracts', 'shared/outOfScope'], packages: ['clipper2-ts'] },
  'shared/layout': { may: ENGINE, packages: [] },
  'shared/sizing': { may: [...ENGINE, 'shared/layout'], packages: [] },
  'shared/takeoff': { may: [...ENGINE, 'shared/layout', 'shared/sizing'], packages: [] },
  'shared/pricing': { may: ['shared/contracts', 'shared/takeoff'], packages: ['decimal.js'] },
  'shared/comparison': { may: ['shared/contracts', 'shared/sizing', 'shared/takeoff', 'shared/pricing'], packages: [] },
  'shared/schedule': { may: [...ENGINE, 'shared/layout', 'shared/sizing'], packages: [] },
  'shared/calculation': { may: [...ENGINE, 'shared/layout', 'shared/sizing'], packages: [] },
  'shared/alsoCompared': {
    may: [...ENGINE, 'shared/sizing', 'shared/takeoff', 'shared/pricing'],
    packages: [],
  },
  'shared/drawing': { may: [...ENGINE, 'shared/layout', 'shared/sizing'], packages: [] },
  'server/entities': { may: ['shared/contracts'], packages: ['typeorm'] },
  'server/services': { may: ['shared', 'server/entities', 'server/errors', 'server/mail', 'server/reports'], packages: ['*'] },
  'server/routes': {
    may: ['shared/contracts', 'server/services', 'server/middleware', 'server/errors', 'server/mail', 'server/reports'],
    packages: ['express', 'zod'],
  },
  'server/middleware': {
    may: ['shared/contracts', 'server/services', 'server/errors', 'server/env', 'server/log'],
    packages: ['*'],
  },
  'server/mail': { may: ['shared', 'server/entities', 'server/errors', 'server/log', 'server/reports'], packages: ['*'] },
  'server/reports': { may: ['shared', 'server/errors'], packages: ['*'] },
  server: { may: ['shared', 'server'], packages: ['*'] },
  'src/api': { may: ['shared/contracts'], packages: ['zod'] },
  'src/stores': { may: ['shared', 'src/api', 'src/workers'], packages: ['pinia', 'vue'] },
  'src/composables': { may: ['shared', 'src/api', 'src/stores', 'src/workers'], packages: ['vue', '@vueuse/core'] },
  'src/components': { may: ['shared', 'src/api', 'src/stores', 'src/composables'], packages: ['*'] },
  src: { may: ['shared', 'src'], packages: ['*'] },
}
const EXTENSIONS = ['.ts', '.vue']
const FILES = ['shared', 'server', 'src'].flatMap((root) =>
  readdirSync(root, { recursive: true, encoding: 'utf8' })
    .map((name) => join(root, name))
    .filter((file) => EXTENSIONS.includes(extname(file))),
)

/** Static imports and re-exports of a file; `target` is a project file, absent for a package. */
function importsOf(file: string) {
  const statements = readFileSync(file, 'utf8').matchAll(
    /^\s*(?:import|export)\s+(type\s)?(?:[^'"]*?\sfrom\s*)?['"]([^'"]+)['"]/gm,
  )
  return [...statements].map(([, type, specifier]) => {
    const base = specifier!.startsWith('#shared/')
      ? specifier!.slice(1)
      : specifier!.startsWith('.')
        ? join(dirname(file), specifier!)
        : undefined
    const target = base && [base, ...EXTENSIONS.map((extension) => base + extension)].find((path) => FILES.includes(path))
    return { specifier: specifier!, target, isType: Boolean(type), isPackage: base === undefined }
  })
}

const layerOf = (file: string) =>
  Object.keys(LAYERS)
    .filter((layer) => file.startsWith(`${layer}/`))
    .sort((a, b) => b.length - a.length)[0]!

describe('architecture', () => {
  it.each(FILES)('%s imports only what its layer may', (file) => {
    const layer = layerOf(file)
    const { may, packages } = LAYERS[layer]!
    const broken = importsOf(file).filter(({ specifier, target, isType, isPackage }) =>
      isPackage
        ? !isType && !packages.some((name) => name === '*' || specifier === name || specifier.startsWith(`${name}/`))
        : target && ![layer, ...may].some((prefix) => target.startsWith(`${prefix}/`) || target.startsWith(`${prefix}.`)),
    )
    expect(broken.map(({ specifier }) => specifier)).toEqual([])
  })

  it('has no import cycle', () => {
    const state = new Map<string, 'open' | 'done'>()
    function visit(file: string, path: string[]) {
      if (state.get(file) === 'done') return
      if (state.get(file) === 'open') expect.fail([...path.slice(path.indexOf(file)), file].join(' → '))
      state.set(file, 'open')
      for (const { target, isType } of importsOf(file)) if (target && !isType) visit(target, [...path, file])
      state.set(file, 'done')
    }
    for (const file of FILES) visit(file, [])
  })
})
