import type ExcelJS from 'exceljs'

type Book = ExcelJS.Workbook

/** What a cell holds, worked out from its formula and those it refers to; what is kept beside formulas is not looked at. */
export function cellNumber(book: Book, sheet: string, address: string): number {
  const { value } = book.getWorksheet(sheet)!.getCell(address)
  if (typeof value === 'number') return value
  if (value !== null && typeof value === 'object' && 'formula' in value) return evaluate(book, sheet, String(value.formula ?? ''))
  throw new Error(`${sheet}!${address} holds no number: ${JSON.stringify(value)}`)
}

const TOKEN = /\s*(?:(\d+(?:\.\d+)?)|(?:'([^']+)'!|([a-z]+)!)?([A-Z]+)(\d+)(?::([A-Z]+)(\d+))?|(SUM|ROUND)\(|([-+*/(),]))/y

/** Value of a formula of + − × ÷, brackets, SUM of a column's range and ROUND, halves away from zero, by recursive descent. */
function evaluate(book: Book, sheet: string, formula: string): number {
  let at = 0
  let token: RegExpExecArray | null = null
  const next = () => {
    TOKEN.lastIndex = at
    token = TOKEN.exec(formula)
    if (token === null && at < formula.length) throw new Error(`not understood: ${formula.slice(at)}`)
    at = TOKEN.lastIndex
  }
  const sign = () => token?.[9]
  const expected = (wanted: string) => {
    if (sign() !== wanted) throw new Error(`expected ${wanted} in ${formula}`)
    next()
  }
  const range = (place: string, [, , , , column, from, , to]: RegExpExecArray): number => {
    let sum = 0
    for (let row = Number(from); row <= Number(to); row++) sum += cellNumber(book, place, `${column}${row}`)
    return sum
  }
  function factor(): number {
    const found = token
    if (found === null) throw new Error(`broken off: ${formula}`)
    next()
    if (found[1] !== undefined) return Number(found[1])
    if (found[4] !== undefined) {
      const place = found[2] ?? found[3] ?? sheet
      return found[7] === undefined ? cellNumber(book, place, `${found[4]}${found[5]}`) : range(place, found)
    }
    if (found[8] === 'ROUND') return rounded()
    const inside = sum()
    expected(')')
    return inside
  }
  function rounded(): number {
    const value = sum()
    expected(',')
    const scale = 10 ** sum()
    expected(')')
    return Math.round(Number((value * scale).toPrecision(15))) / scale
  }
  function product(): number {
    let value = factor()
    while (sign() === '*' || sign() === '/') {
      const isTimes = sign() === '*'
      next()
      const other = factor()
      value = isTimes ? value * other : value / other
    }
    return value
  }
  function sum(): number {
    let value = product()
    while (sign() === '+' || sign() === '-') {
      const isPlus = sign() === '+'
      next()
      const other = product()
      value = isPlus ? value + other : value - other
    }
    return value
  }
  next()
  return sum()
}
