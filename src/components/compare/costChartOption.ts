import type { BarSeriesOption } from 'echarts/charts'
import type { AriaComponentOption, GridComponentOption, TooltipComponentOption } from 'echarts/components'
import type { ComposeOption } from 'echarts/core'
import { formatDecimal } from '../base/formatDecimal'
import type { SectionCost } from './costBySection'

export type CostChartOption = ComposeOption<BarSeriesOption | GridComponentOption | TooltipComponentOption | AriaComponentOption>

/** Values of the page's colour tokens, so that the chart follows the theme. */
export interface ChartColours {
  readonly ink: string
  readonly ink2: string
  readonly hair: string
  readonly paper: string
  readonly clay: string
  readonly clayInk: string
  readonly clayWash: string
  readonly slate: string
  readonly slateWash: string
}

type Kind = 'ribbed' | 'solid'
const FONT = '"Source Sans 3", sans-serif'

/** Cost by work section as pairs of bars in the schemes' colours and hatches, each with its own label. */
export function costChartOption(
  sections: readonly SectionCost[],
  currency: string,
  colours: ChartColours,
  isNarrow: boolean,
): CostChartOption {
  const axisText = { color: colours.ink2, fontSize: 13, fontFamily: FONT }
  return {
    animation: false,
    aria: { enabled: false, decal: { show: true } },
    grid: { left: 0, right: isNarrow ? 96 : 130, top: 4, bottom: 24, outerBoundsMode: 'same', outerBoundsContain: 'axisLabel' },
    tooltip: { trigger: 'axis', renderMode: 'richText', axisPointer: { type: 'none' }, ...tooltipOf(colours, currency) },
    xAxis: {
      type: 'value',
      axisLabel: { ...axisText, fontSize: 12, hideOverlap: true, formatter: (value: number) => short(value) },
      splitLine: { lineStyle: { color: colours.hair, width: 1 } },
      splitNumber: isNarrow ? 3 : 5,
    },
    yAxis: {
      type: 'category',
      inverse: true,
      data: sections.map(({ name }) => name),
      axisLabel: {
        ...axisText,
        color: colours.ink,
        fontSize: isNarrow ? 12 : 14,
        width: isNarrow ? 88 : 200,
        overflow: 'break',
        lineHeight: isNarrow ? 14 : 18,
      },
      axisLine: { lineStyle: { color: colours.ink, width: 1.5 } },
      axisTick: { show: false },
    },
    series: [series('ribbed', sections, colours), series('solid', sections, colours)],
  }
}

function series(kind: Kind, sections: readonly SectionCost[], colours: ChartColours): BarSeriesOption {
  const isRibbed = kind === 'ribbed'
  const line = isRibbed ? colours.clay : colours.slate
  return {
    type: 'bar',
    name: isRibbed ? 'Ribbed' : 'Solid',
    barMaxWidth: 16,
    barGap: '25%',
    barCategoryGap: '38%',
    itemStyle: {
      color: isRibbed ? colours.clayWash : colours.slateWash,
      borderColor: line,
      borderWidth: 1,
      decal: isRibbed
        ? { symbol: 'rect', color: line, dashArrayX: [1, 0], dashArrayY: [1.2, 4.8], rotation: -Math.PI / 4 }
        : {
            symbol: 'circle',
            color: line,
            symbolSize: 0.6,
            dashArrayX: [
              [4, 4],
              [0, 4, 4, 0],
            ],
            dashArrayY: [4, 0],
          },
    },
    label: {
      show: true,
      position: 'right',
      color: isRibbed ? colours.clayInk : colours.slate,
      fontFamily: FONT,
      fontSize: 13,
      formatter: ({ dataIndex }) => label(kind, sections[dataIndex]),
    },
    data: sections.map(({ amounts }) => Number(amounts[kind])),
  }
}

function label(kind: Kind, section: SectionCost | undefined): string {
  if (section === undefined) return ''
  const amount = section.amounts[kind]
  return `${kind} ${Number(amount) === 0 ? 'none' : formatDecimal(amount, { decimals: 0 })}`
}

function tooltipOf(colours: ChartColours, currency: string): TooltipComponentOption {
  return {
    backgroundColor: colours.paper,
    borderColor: colours.ink,
    borderRadius: 0,
    shadowBlur: 0,
    textStyle: { color: colours.ink, fontFamily: FONT, fontSize: 13 },
    valueFormatter: (value) => `${formatDecimal(String(value), { decimals: 2 })} ${currency}`,
  }
}

function short(value: number): string {
  if (value >= 1e6) return `${Number((value / 1e6).toPrecision(3))}M`
  return value >= 1000 ? `${Number((value / 1000).toPrecision(3))}k` : String(value)
}
