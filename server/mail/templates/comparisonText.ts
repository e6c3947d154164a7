import { CHECK_NAMES } from '../../reports/content/checkNames'
import { sentenceText } from '../../reports/content/headline'
import type { CheckedScheme, ReportContent } from '../../reports/content/reportContent'
import type { ReportFact } from '../../reports/content/reportFact'
import { dayText, figureText } from '../../reports/figureText'
import type { FrozenComparison } from '../../reports/frozenComparison'

const LABEL_WIDTH = 26
const FIGURE_WIDTH = 12

function part(heading: string, lines: readonly string[]): string[] {
  return ['', heading, '-'.repeat(heading.length), ...lines]
}

function factLines(facts: readonly ReportFact[]): string[] {
  return facts.map(({ title, text }) => `${title}: ${text}`)
}

function better(heading: string, facts: readonly ReportFact[]): string[] {
  return facts.length === 0 ? [] : part(heading, factLines(facts))
}

function figureLines({ figures }: ReportContent): string[] {
  const row = (label: string, ribbed: string, solid: string) =>
    label.padEnd(LABEL_WIDTH) + ribbed.padStart(FIGURE_WIDTH) + solid.padStart(FIGURE_WIDTH)
  return [row('', 'Ribbed', 'Solid'), ...figures.map(({ label, unit, ribbed, solid }) => row(`${label}, ${unit}`, ribbed, solid))]
}

function differenceLines({ bars, currency, totalDifference }: ReportContent): string[] {
  const widest = Math.max(...bars.map(({ label }) => label.length), 20)
  const row = (label: string, amount: string) => label.padEnd(widest + 2) + amount.padStart(FIGURE_WIDTH)
  return [
    `Ribbed less solid, ${currency}; a minus means that ribbed is cheaper there.`,
    ...bars.map(({ label, amount }) => row(label, amount)),
    row('Ribbed less solid', totalDifference),
  ]
}

function besideLines({ beside }: ReportContent): string[] {
  return beside.flatMap(({ name, rows }) => [
    name,
    ...rows.flatMap(({ label, unit, ribbed, solid, verdict, remark }) => [
      `  ${label}, ${unit}: ribbed ${ribbed}, solid ${solid}${verdict === '' ? '' : `, ${verdict}`}`,
      ...(remark === '' ? [] : [`    ${remark}`]),
    ]),
  ])
}

function checkLines({ kind, mark, summary, checks }: CheckedScheme): string[] {
  return [
    `${kind === 'ribbed' ? 'Ribbed' : 'Solid'}, ${mark}: ${summary}`,
    ...checks.map(
      ({ name, clause, level, panel, utilisation, pass }) =>
        `  ${CHECK_NAMES[name]}: ${figureText(utilisation, 2)} of what is allowed, ${pass ? 'passes' : 'FAILS'} (${level}, ${panel}; ${clause})`,
    ),
  ]
}

/** The whole report as plain text, for mail programs that show no other and for readers who prefer it. */
export function comparisonText(frozen: FrozenComparison, content: ReportContent): string {
  const { firm, project, recipient } = frozen
  const lines = [
    firm.isDemo ? `${firm.name} (demo data)` : firm.name,
    `${project.place === '' ? project.name : `${project.name}, ${project.place}`}. For ${recipient.name}, ${dayText(frozen.frozenAt)}.`,
    '',
    sentenceText(content.headline),
    content.standfirst,
    ...(content.scopeCaution === '' ? [] : [content.scopeCaution]),
    ...(content.note === '' ? [] : ['', content.note]),
    ...part('What each makes', figureLines(content)),
    ...part('Where the difference comes from', differenceLines(content)),
    ...(content.turning.length === 0 ? [] : part('What would turn it', content.turning)),
    ...(content.beside.length === 0 ? [] : part('Also compared', besideLines(content))),
    ...better('Whether both totals hold the same', content.scopeFacts),
    ...better('Where solid is better', content.better.solid),
    ...better('Where ribbed is better', content.better.ribbed),
    ...part('What stands behind it', factLines(content.basis)),
    ...part('What is left out', content.leftOut),
    ...part('Checks', content.checked.flatMap(checkLines)),
    ...part('Before anyone builds', content.cautions),
    '',
    ...factLines(content.titleBlock),
    '',
    'Both floors are drawn in the attached PDF.',
  ]
  return `${lines.join('\n')}\n`
}
