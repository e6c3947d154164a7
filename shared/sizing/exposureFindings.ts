import type { CodeBasis, ExposedBars } from './codeBasis'
import type { Finding } from './finding'

/**
 * Cover of the outermost bars for the exposure the brief names; nothing where it names none.
 *
 * Source: by the basis, `exposureCover`
 */
export function exposureFindings(basis: CodeBasis, bars: ExposedBars): Finding[] {
  return basis.exposureCover(bars).map((each): Finding => ({ name: 'cover.exposure', place: () => 'outermost bars', ...each }))
}
