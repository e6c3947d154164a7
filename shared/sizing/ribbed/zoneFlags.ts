import { figure } from '../figure'
import { type Finding, isMet, utilisationOf } from '../finding'
import type { RibTask } from './ribDesign'
import { widestZoneMm } from './solidZones'

/** Share of the ribs beyond which solid zones are no longer told as a matter of course. Source: project rule, no source */
const GREAT_SHARE = 0.5

/** Places of checks that the width of the zone decides. */
const atZone = ({ place }: Finding) => place().endsWith(', rib') || place().endsWith('where the rib begins')

/**
 * How wide a zone left to the engine became and for what; where it takes up most of the ribs, or even the widest does not do, that it is so
 * and what would help.
 *
 * Source: project rule, what was chosen is stated, and what cannot pass says why
 */
export function zoneFlags({ panel, scheme }: RibTask, findings: readonly Finding[]): string[] {
  const { solidZoneMm, clearMm } = panel
  if (scheme.solidZone !== 'least' || solidZoneMm === 0) return []
  const failing = findings.filter((finding) => atZone(finding) && !isMet(finding.demand, finding.capacity))
  const widened = `solid zone widened to ${figure(solidZoneMm, 0)} mm for shear and for bending of the ribs at supports`
  if (failing.length > 0 && solidZoneMm >= widestZoneMm(clearMm)) return [hopeless(solidZoneMm, clearMm, failing)]
  const share = (2 * solidZoneMm) / clearMm
  if (share <= GREAT_SHARE) return [widened]
  return [
    `${widened}: the zones take up ${figure(100 * share, 0)} % of the ribs, ${figure(clearMm, 0)} mm long, so that little of the panel is ` +
      `ribbed; wider or deeper ribs, stronger concrete, or a solid panel would serve better`,
  ]
}

function hopeless(solidZoneMm: number, clearMm: number, failing: readonly Finding[]): string {
  const used = ({ demand, capacity }: Finding) => utilisationOf(demand, capacity)
  const worst = failing.reduce((a, b) => (used(b) > used(a) ? b : a))
  return (
    `no solid zone that leaves blocks between supports lets the ribs pass: shown with the widest, ${figure(solidZoneMm, 0)} mm of ` +
    `${figure(clearMm, 0)} mm; ${worst.place()} governs (${worst.clause}, used to ${figure(used(worst), 2)}): wider or deeper ribs, or a ` +
    `solid panel`
  )
}
