/**
 * How many bars stand in on either side of a void for those it cuts: half each, rounded up; all on one side where the other has no room.
 *
 * Source: common practice of trimming openings, no source
 * @param cut - bars that the void cuts
 * @param hasRoom - below and above it
 */
export function eitherSide(cut: number, hasRoom: readonly [boolean, boolean]): [number, number] {
  const [below, above] = hasRoom
  if (below && above) return [Math.ceil(cut / 2), Math.ceil(cut / 2)]
  return [below ? cut : 0, above ? cut : 0]
}
