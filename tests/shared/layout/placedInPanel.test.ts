import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { appraiseInFull } from '../../../shared/appraise'
import { appraisalFile } from '../../../shared/contracts/appraisal'
import { boundsOf } from '../../../shared/geometry/ring'

const example = appraisalFile.parse(
  JSON.parse(readFileSync(new URL('../../../shared/examples/tarn-court.json', import.meta.url), 'utf8')),
)

describe('a ribbed scheme laid out', () => {
  it('lays the blocks of every panel in that panel, also where panels are alike and their solid zones are not', () => {
    const { sized } = appraiseInFull(example)
    const ribbed = sized.find(({ kind }) => kind === 'ribbed')!
    expect(new Set(ribbed.panels.map(({ layout }) => layout!.solidZone)).size).toBeGreaterThan(1)
    for (const { level, mark, layout } of ribbed.panels) {
      const { outline } = example.levels.find((each) => each.mark === level)!.panels.find((each) => each.mark === mark)!
      const box = boundsOf(outline)
      const laid = boundsOf(layout!.blocks.flatMap(({ ring }) => ring))
      expect([laid.minX >= box.minX, laid.minY >= box.minY, laid.maxX <= box.maxX, laid.maxY <= box.maxY], mark).toEqual([
        true,
        true,
        true,
        true,
      ])
      expect(boundsOf(layout!.clear).minX, mark).toBeGreaterThanOrEqual(box.minX)
    }
  })
})
