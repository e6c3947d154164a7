import { basisName } from '#shared/sizing/basisName'
import { dayText } from '../figureText'
import type { FrozenComparison } from '../frozenComparison'
import type { ReportFact } from './reportFact'

/** The fields in which a drawing sheet ends. */
export function titleBlock(frozen: FrozenComparison): ReportFact[] {
  const { project, firm, recipient, edition, ribbed, solid } = frozen
  return [
    { title: 'Project', text: project.name },
    { title: 'Reference', text: project.reference },
    { title: 'Place', text: project.place === '' ? 'not given' : project.place },
    { title: 'Date', text: dayText(frozen.frozenAt) },
    { title: 'Schemes', text: `${ribbed.specification.mark} and ${solid.specification.mark}` },
    { title: 'Sized by', text: basisName(frozen.brief) },
    { title: 'Rates', text: `${edition.region}, edition ${edition.number}` },
    { title: 'Prepared by', text: frozen.preparedBy },
    { title: 'Firm', text: firm.isDemo ? `${firm.name}, demo data` : firm.name },
    { title: 'For', text: recipient.name },
  ]
}
