import type { BuildUp, LabourLine, MaterialLine, PlantLine } from '#shared/contracts/buildUp'

/** Lines to type into, and a build-up with one material to begin with. */
export const newMaterial = (): MaterialLine => ({
  resource: '',
  quantity: '1',
  wastePercent: '0',
  uses: 1,
  isBlock: false,
  source: '',
})
export const newLabour = (): LabourLine => ({ gang: '', basis: 'hours', value: '', source: '' })
export const newPlant = (): PlantLine => ({ resource: '', fuel: null, outputPerHour: '', source: '' })
export const newBuildUp = (): BuildUp => ({
  materials: [newMaterial()],
  labour: [],
  plant: [],
  overheadsPercent: '0',
  profitPercent: '0',
})
