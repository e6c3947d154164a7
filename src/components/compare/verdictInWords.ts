import type { FigureVerdict } from './compareFigures'

/** A verdict as it stands under the difference: '−5%, ribbed better'; 'the same'; empty where neither is better. */
export function verdictInWords({ better, share }: FigureVerdict): string {
  if (better === 'same') return 'the same'
  const percent =
    share === null ? '' : `${share < 0 ? '−' : '+'}${Math.abs(share * 100).toFixed(Math.abs(share) < 0.02 ? 1 : 0)}%`
  if (better === 'neither') return percent
  return percent === '' ? `${better} better` : `${percent}, ${better} better`
}
