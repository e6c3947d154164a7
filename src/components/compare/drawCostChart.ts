import { BarChart } from 'echarts/charts'
import { AriaComponent, GridComponent, TooltipComponent } from 'echarts/components'
import { init, use } from 'echarts/core'
import { CanvasRenderer } from 'echarts/renderers'
import type { CostChartOption } from './costChartOption'

use([BarChart, GridComponent, TooltipComponent, AriaComponent, CanvasRenderer])

/** A chart on the page; the whole module is loaded only where a chart is shown. */
export interface DrawnChart {
  readonly show: (option: CostChartOption) => void
  readonly resize: () => void
  readonly dispose: () => void
}

/** Puts an empty chart into the element. */
export function drawCostChart(element: HTMLElement): DrawnChart {
  const chart = init(element, null, { renderer: 'canvas', devicePixelRatio: Math.max(2, window.devicePixelRatio) })
  return {
    show: (option) => chart.setOption(option, { notMerge: true }),
    resize: () => chart.resize(),
    dispose: () => chart.dispose(),
  }
}
