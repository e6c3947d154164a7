const WORDS: Readonly<Record<string, string>> = {
  sourceDate: 'day of the price',
  validUntil: 'holds until',
  wastePercent: 'waste, %',
  overheadsPercent: 'overheads, %',
  profitPercent: 'profit, %',
  perHour: 'an hour',
  outputPerHour: 'output an hour',
  isBlock: 'a scheme’s own block',
  basis: 'given as',
}
const UNTOLD = ['buildUp']

/** A place in a form of prices as it is called there: `buildUp.materials.0.wastePercent` is 'materials 1, waste, %'. */
export function placeInWords(path: string): string {
  const steps = path.split('.').filter((step) => !UNTOLD.includes(step))
  return steps.reduce((words, step) => {
    if (/^\d+$/.test(step)) return `${words} ${Number(step) + 1}`
    return [words, WORDS[step] ?? step].filter((part) => part !== '').join(', ')
  }, '')
}
