const NO_SOURCE = 'common practice, no source'

/**
 * Labour outputs proposed to a firm until it types its own: man-hours per m³, m² or m, kilograms or blocks per man-hour.
 *
 * Source: common practice, no source; bars calculated from published constants for cutting, bending and fixing in suspended slabs
 */
export const PROPOSED_LABOUR = {
  concrete: {
    value: 29,
    source: `Proposed: mixed on site and placed in suspended slabs by hand, calculated from outputs in common use; ready-mixed and pumped 12–25 m³ an hour for the whole gang (${NO_SOURCE})`,
  },
  barsTo8: { value: 11, source: 'Proposed: cut, bend and fix 6 and 8 mm, calculated from published outputs' },
  barsTo12: { value: 14, source: 'Proposed: cut, bend and fix 10 and 12 mm, calculated from published outputs' },
  barsTo20: { value: 20, source: 'Proposed: cut, bend and fix 16 and 20 mm, calculated from published outputs' },
  barsOver20: { value: 25, source: 'Proposed: cut, bend and fix 25 mm and over, calculated from published outputs' },
  mesh: { value: 0.075, source: `Proposed: 0.05–0.10 man-hour per m² (${NO_SOURCE})` },
  blocks: { value: 30, source: `Proposed: 25–40 blocks a man-hour, ends closed with the laying (${NO_SOURCE})` },
  soffit: { value: 2, source: `Proposed: traditional, fix and strike, 1.5–2.5 man-hours per m² (${NO_SOURCE})` },
  edge: { value: 0.5, source: `Proposed: as soffit formwork over an edge 0.25 m deep (${NO_SOURCE})` },
  leastGang: 8,
  hoursPerDay: 8,
  daysPerWeek: 5,
  airTemperature: 16,
}
