/** An expression of the engine as it is read: × for times, a true minus. */
export function expressionInWords(expression: string): string {
  return expression.replaceAll('*', '×').replaceAll('-', '−')
}
