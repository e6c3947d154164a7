/**
 * Value of plain arithmetic: numbers, `+ - * / ( )` and spaces. Anything else, a sign before a number and an exponent included,
 * is refused.
 */
export function evaluate(expression: string): number {
  const tokens = expression.match(/\d+(?:\.\d+)?|[-+*/()]|\S/g) ?? []
  let at = 0
  const isNext = (...symbols: string[]) => symbols.includes(tokens[at] ?? '')
  function factor(): number {
    const token = tokens[at++]
    if (token === '(') {
      const inner = sum()
      if (tokens[at++] !== ')') throw new SyntaxError(`expected ) in ${expression}`)
      return inner
    }
    if (token === undefined || !/^\d/.test(token)) throw new SyntaxError(`expected a number in ${expression}, got ${token}`)
    return Number(token)
  }
  function product(): number {
    let value = factor()
    while (isNext('*', '/')) value = tokens[at++] === '*' ? value * factor() : value / factor()
    return value
  }
  function sum(): number {
    let value = product()
    while (isNext('+', '-')) value = tokens[at++] === '+' ? value + product() : value - product()
    return value
  }
  const value = sum()
  if (at !== tokens.length) throw new SyntaxError(`expected the end of ${expression}, got ${tokens[at]}`)
  return value
}
