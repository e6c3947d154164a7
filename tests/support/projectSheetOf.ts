import { markups } from '#shared/contracts/appraisal'
import type { ProjectSheet, ProjectSummary } from '#shared/contracts/project'
import type { Session } from '#shared/contracts/session'
import type { Role } from '#shared/contracts/person'
import { aFile } from './appraisalFileOf'

const idOf = (number: number) => `00000000-0000-4000-8000-${String(number).padStart(12, '0')}`
export const projectId = idOf(1)
export const levelId = idOf(2)
export const ribbedId = idOf(3)
export const solidId = idOf(4)
export const editionId = idOf(5)
export const bookId = idOf(6)
export const personId = idOf(7)

/** A stored project with one level of panels by these marks, and both schemes. */
export function aSheet(marks: readonly string[] = ['P1', 'P2']): ProjectSheet {
  const { brief, levels, schemes, factors } = aFile(marks)
  return {
    project: {
      id: projectId,
      version: 1,
      name: 'Tarn Court',
      reference: 'TC-02',
      place: 'Ostrel Isles',
      use: 'A',
      brief,
      editionId,
      markups: markups.parse({ preliminariesPercent: '10', contingencyPercent: '5' }),
      measurement: 'comparing',
      scope: [],
      factors,
      updatedAt: '2026-11-30T10:00:00.000Z',
      updatedBy: 'surveyor@example.test',
    },
    levels: levels.map((level) => ({ ...level, name: 'Typical', id: levelId, version: 4, position: 1 })),
    schemes: schemes.map((specification, at) => ({
      id: at === 0 ? ribbedId : solidId,
      version: 2,
      position: at + 1,
      name: specification.kind,
      blockId: null,
      specification,
    })),
    overrides: [],
    edition: {
      id: editionId,
      bookId,
      region: 'Eastmere',
      currency: 'USD',
      number: 4,
      state: 'published',
      baseDate: '2026-03-01',
      validUntil: null,
      compiledBy: 'estimator@example.test',
      checkedBy: 'checker@example.test',
      taxBasis: 'before tax',
      note: '',
      holdsOverheads: true,
      reason: '',
      corrects: null,
      stateReason: '',
      isOwnWork: false,
      version: 1,
      blockRates: [],
      rates: [
        {
          item: 'concrete.slab',
          description: 'Concrete C25/30',
          unit: 'm³',
          low: '124',
          likely: '149.63',
          high: '178',
          source: 'agreed',
          sourceDate: null,
          buildUp: null,
          version: 1,
        },
      ],
    },
  }
}

export function aSummary(given: Partial<ProjectSummary> = {}): ProjectSummary {
  return {
    id: projectId,
    name: 'Tarn Court',
    reference: 'TC-02',
    place: 'Ostrel Isles',
    levelCount: 1,
    panelCount: 7,
    canOpen: true,
    edition: { region: 'Eastmere', number: 4, currency: 'USD' },
    totals: [
      { mark: 'R1', kind: 'ribbed', total: '80030.08' },
      { mark: 'S1', kind: 'solid', total: '84134.67' },
    ],
    unequalScope: '',
    updatedAt: '2026-11-30T10:00:00.000Z',
    ...given,
  }
}

export function aSession(...roles: Role[]): Session {
  return {
    person: { id: personId, name: 'A person', email: 'person@example.test', roles },
    firm: { id: idOf(8), name: 'Quillmark Surveyors', isDemo: true },
    hasLocalMail: true,
  }
}
