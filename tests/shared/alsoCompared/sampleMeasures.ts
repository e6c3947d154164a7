import type { SchemeMeasures } from '#shared/takeoff/schemeMeasures'

/** Round figures of a ribbed floor: 100 m² on two floors, 10 m³, 500 blocks of 8 kg, 600 kg of bars and 222 kg of mesh A142. */
export function ribbedMeasures(changed: Partial<SchemeMeasures> = {}): SchemeMeasures {
  return {
    grossAreaM2: 125,
    ownAreaM2: 100,
    floorCount: 2,
    concreteM3: 10,
    blockCount: 500,
    blocksKg: 4000,
    barsKg: { 8: 100, 12: 200, 16: 300 },
    meshM2: 100,
    meshKg: 222,
    soffitM2: 100,
    edgeM: 20,
    ...changed,
  }
}

/** The same floor solid, 150 mm thick. */
export function solidMeasures(changed: Partial<SchemeMeasures> = {}): SchemeMeasures {
  return {
    ...ribbedMeasures(),
    concreteM3: 15,
    blockCount: 0,
    blocksKg: 0,
    barsKg: { 10: 900 },
    meshM2: 0,
    meshKg: 0,
    ...changed,
  }
}
