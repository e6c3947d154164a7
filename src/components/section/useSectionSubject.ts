import type { CatalogueBlock } from '#shared/contracts/blockCatalogue'
import type { StoredScheme } from '#shared/contracts/project'
import type { SectionSubject } from '#shared/drawing/sectionBody'
import { sectionReinforcement } from '#shared/drawing/sectionReinforcement'
import { useProjectStore } from '../../stores/project'

/** A stored scheme of the open project as its cross-section shows it: sizes as typed, depth and bars as sized. */
export function useSectionSubject() {
  const store = useProjectStore()

  /** @param panelMark - panel whose bars are drawn; absent: the first panel sized */
  function subjectOf(row: StoredScheme, blocks: readonly CatalogueBlock[] = [], panelMark?: string): SectionSubject {
    const { specification } = row
    const result = store.full?.appraisal.schemes.find(({ mark }) => mark === specification.mark)
    const sized = store.full?.sized.find(({ mark }) => mark === specification.mark)
    const panel = sized?.panels.find(({ mark }) => panelMark === undefined || mark === panelMark) ?? null
    const material = blocks.find(({ id }) => id === row.blockId)?.material
    return {
      scheme: specification,
      depthMm: result?.depth ?? null,
      reinforcement: sectionReinforcement(specification, store.project?.brief.cover ?? 0, panel),
      ...(material === undefined ? {} : { blockMaterial: material }),
    }
  }

  return { subjectOf }
}
