import { mount } from '@vue/test-utils'
import { describe, expect, it } from 'vitest'
import type { VueWrapper } from '@vue/test-utils'
import { nextTick } from 'vue'
import { bands, columns, curve, holdings, matrix, oneDecimal, ratios, strips } from './chartData'
import HoldingStrip from '~/components/chart/HoldingStrip.vue'
import Matrix from '~/components/chart/Matrix.vue'
import Ratio from '~/components/chart/Ratio.vue'
import WindLadder from '~/components/chart/WindLadder.vue'

const strip = (more = {}) => mount(HoldingStrip, { props: { rows: strips, load: 3.4, unit: 'kN', format: oneDecimal, axisTitle: 'Holding', ...more } })
const ladder = () => mount(WindLadder, { props: { curve, rows: holdings, bands, windUnit: 'kn', loadUnit: 'kN', formatWind: (value: number) => value.toFixed(0), formatLoad: oneDecimal } })

async function press(chart: VueWrapper, ...keys: string[]): Promise<string> {
  for (const key of keys) await chart.get('[role="application"]').trigger('keydown', { key })
  return chart.get('[aria-live]').text()
}

describe('every chart', () => {
  const all = { strip, ladder, matrix: () => mount(Matrix, { props: { columns, rows: matrix } }), ratio: () => mount(Ratio, { props: { rows: ratios } }) }

  it.each(Object.entries(all))('%s is one tab stop, drawn wide and narrow, hidden from readers who hear the words', async (_, make) => {
    const chart = make()
    await nextTick()
    expect(chart.findAll('[tabindex="0"]')).toHaveLength(1)
    const sheets = chart.findAll('svg.chart-sheet')
    expect(sheets).toHaveLength(2)
    expect(sheets.every(sheet => sheet.attributes('aria-hidden') === 'true' && Number(sheet.attributes('height')) > 100)).toBe(true)
    expect(chart.html()).not.toMatch(/NaN|Infinity|undefined/)
  })

  it.each(Object.entries(all))('%s shows where the reader stands, and nothing once the reader has left', async (_, make) => {
    const chart = make()
    expect(chart.findAll('.here')).toHaveLength(0)
    await press(chart, 'ArrowDown')
    expect(chart.findAll('.chart-wide .here').length).toBeGreaterThan(0)
    await chart.get('[role="application"]').trigger('blur')
    expect(chart.findAll('.here')).toHaveLength(0)
  })
})

describe('a holding strip', () => {
  it('speaks label, value, interval, n and unit, and each pull from the weakest up', async () => {
    const chart = strip()
    expect(await press(chart, 'ArrowDown')).toBe('Tern, 20 kg: 5.0\u00A0kN, 90 % interval 3.5 to 7.0\u00A0kN, 3 pulls; 3 pulls on 2 days')
    expect(await press(chart, 'ArrowRight')).toBe('Tern, 20 kg, pull 1 of 3: 4.0\u00A0kN')
    expect(await press(chart, 'ArrowRight', 'ArrowRight')).toContain('pull 3 of 3: 9.0\u00A0kN, or more')
    expect(await press(chart, 'ArrowDown')).toContain('no pulls, thin evidence')
  })

  it('draws every pull, the load, and a thin row dashed without its thick interval', () => {
    const wide = strip().get('.chart-wide')
    expect(wide.findAll('path.curve').map(path => path.attributes('d')?.match(/M/g)?.length)).toEqual([2])
    expect(wide.text()).toContain('load 3.4\u00A0kN')
    expect(wide.findAll('line[stroke-dasharray]')).toHaveLength(1)
    expect(wide.findAll('line[stroke-width="5"]')).toHaveLength(1)
    expect(wide.html()).toContain('url(#seabed-loose-sand)')
  })

  it('leaves out the load where there is none, and says when there is nothing', () => {
    expect(strip({ load: null }).find('.load-words').exists()).toBe(false)
    const empty = strip({ rows: [] })
    expect(empty.text()).toContain('nothing to draw')
    expect(empty.find('[tabindex]').exists()).toBe(false)
  })
})

describe('a wind ladder', () => {
  it('says what each holds to, at least so much, or that no wind is shown', async () => {
    const chart = ladder()
    expect(await press(chart, 'Home')).toBe('Tern: holding 9.0\u00A0kN, holds to 30\u00A0kn')
    expect(await press(chart, 'ArrowDown')).toBe('Merle: holding 40.0\u00A0kN, holds to 40\u00A0kn or more')
    expect(await press(chart, 'ArrowDown')).toBe('Hook: holding 0.1\u00A0kN, at no wind shown')
  })

  it('draws one crossing a holding wind, and its band', () => {
    const wide = ladder().get('.chart-wide')
    expect(wide.findAll('circle').map(circle => circle.attributes('cx'))).toEqual(['75%'])
    expect(wide.text()).toContain('F6')
  })
})

describe('a matrix', () => {
  it('says in words where there are no pulls, wide and narrow', () => {
    const chart = mount(Matrix, { props: { columns, rows: matrix } })
    expect(chart.get('.chart-wide').text().match(/no\s*pulls\s*here/g)).toHaveLength(3)
    expect(chart.get('.chart-narrow').text()).toContain('no pulls here: loose sand, silt')
  })

  it('is stepped through as a table, in its columns', async () => {
    const chart = mount(Matrix, { props: { columns, rows: matrix } })
    expect(await press(chart, 'ArrowDown', 'ArrowRight')).toBe('Tern, loose sand: 5.0 kN, 3 pulls')
    expect(await press(chart, 'ArrowDown')).toBe('Merle, loose sand: no pulls here')
    expect(chart.get('.chart-wide a').attributes()).toMatchObject({ href: '/designs/tern', tabindex: '-1' })
  })
})

describe('a ratio plot', () => {
  it('has its line at 1, its band from 0.87 to 1.15 round it, and the verdict in words', async () => {
    const chart = mount(Ratio, { props: { rows: ratios } })
    const wide = chart.get('.chart-wide')
    const band = wide.get('.band')
    const [x, width] = [Number.parseFloat(band.attributes('x') ?? ''), Number.parseFloat(band.attributes('width') ?? '')]
    const one = Number.parseFloat(wide.get('.stroke-rust').attributes('x1') ?? '')
    expect(one).toBe(50)
    expect((x + width - one) / (one - x)).toBeCloseTo(Math.log(1.15) / -Math.log(0.87), 2)
    expect(wide.text()).toContain('no difference that matters')
    expect(await press(chart, 'End')).toBe('firm mud: ratio 1.32, 90 % interval 1.12 to 1.55, 16 pulls: better')
  })
})
