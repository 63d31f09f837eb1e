import { mount } from '@vue/test-utils'
import { describe, expect, it } from 'vitest'
import { createSSRApp, h, nextTick } from 'vue'
import { renderToString } from 'vue/server-renderer'
import { oneDecimal, strips } from './chartData'
import Figure from '~/components/chart/Figure.vue'
import HoldingStrip from '~/components/chart/HoldingStrip.vue'
import { drawingFile } from '~/utils/chart/save'

const figure = {
  title: 'Holding on loose sand', finding: 'The Tern holds most.', name: 'holding-on-loose-sand',
  columns: [{ key: 'label', label: 'Design' }, { key: 'median', label: 'Holding', unit: 'kN', align: 'right' as const }],
  rows: [{ label: 'Tern', median: 5 }, { label: 'Merle', median: null }],
}
const strip = () => h(HoldingStrip, { rows: strips, load: 3.4, unit: 'kN', format: oneDecimal, axisTitle: 'Holding' })

describe('a figure', () => {
  it('comes whole from the server: title, finding, drawing, numbers with their units', async () => {
    const html = await renderToString(createSSRApp(() => h(Figure, figure, { default: strip })))
    for (const part of ['Holding on loose sand</h3>', 'The Tern holds most.', 'chart-wide', 'chart-narrow', 'Holding (kN)', '<td class="num">5</td>', '<td class="num">–</td>']) expect(html).toContain(part)
    expect(html).not.toContain('tabindex="0" role="application"')
    expect(html).not.toMatch(/ on[a-z]+="/)
  })

  it('names its chart for those who hear it, and keeps the name when the title changes', async () => {
    const page = mount(Figure, { props: figure, slots: { default: strip } })
    expect(page.get('[role="application"]').attributes('aria-label')).toBe('Holding on loose sand')
    await page.setProps({ title: 'Holding on silt', level: 2 })
    expect(page.get('[role="application"]').attributes('aria-label')).toBe('Holding on silt')
    expect(page.get('h2').text()).toBe('Holding on silt')
  })
})

describe('a saved drawing', () => {
  async function saved() {
    document.body.innerHTML = '<svg><defs><pattern id="seabed-loose-sand" width="36" height="24"><path class="dots" d="M4 5h.01"/></pattern></defs></svg><div id="here"></div>'
    const page = mount(Figure, { props: figure, slots: { default: strip }, attachTo: '#here' })
    await page.get('[role="application"]').trigger('keydown', { key: 'ArrowDown' })
    await nextTick()
    const sheet = page.get('.chart-wide .chart-sheet').element
    const file = drawingFile(sheet as SVGSVGElement, { title: figure.title, lines: [figure.finding] })
    return { file, drawing: new DOMParser().parseFromString(file.text, 'image/svg+xml') }
  }

  it('stands by itself: title, finding and patterns within, no class, no link, no frame of the reader’s place', async () => {
    const { file, drawing } = await saved()
    expect(file.text).toContain('Holding on loose sand')
    expect(file.text).toContain('The Tern holds most.')
    expect(drawing.querySelector('defs [id="seabed-loose-sand"]')).not.toBeNull()
    expect(file.text).not.toMatch(/ (?:class|style|tabindex|aria-[a-z]+)="/)
    expect(drawing.querySelectorAll('rect[x="-0.5%"]')).toHaveLength(0)
  })

  it('lays stretched paths out in px: pulls at half of the plot stand at half of its width', async () => {
    const { file } = await saved()
    const laid = /<path d="M([\d.]+) 0v8/.exec(file.text)?.[1]
    const wide = mount(HoldingStrip, { props: { rows: strips, load: 3.4, unit: 'kN', format: oneDecimal, axisTitle: 'Holding' } }).get('.chart-wide path.curve').attributes('d') ?? ''
    const percent = Number(/M([\d.]+)/.exec(wide)?.[1])
    expect(Number(laid)).toBeCloseTo(percent / 100 * 500, 1)
  })
})
