import { embeddedFonts } from './fonts'

const svg = 'http://www.w3.org/2000/svg'
const family = '\'Source Sans 3\', system-ui, sans-serif'
const margin = 24

/** What is copied from the page's styles into a saved drawing, so that it stands without them. */
const ofShapes = ['fill', 'fill-opacity', 'stroke', 'stroke-width', 'stroke-dasharray', 'stroke-linecap', 'stroke-linejoin', 'vector-effect'] as const
const ofTexts = ['fill', 'stroke', 'stroke-width', 'stroke-linejoin', 'paint-order', 'font-size', 'font-weight', 'font-variant-numeric', 'text-anchor'] as const
const shapes = new Set(['rect', 'line', 'path', 'circle'])
const dropped = /^(?:class|style|tabindex|focusable|href|data-.*|aria-.*)$/

/** A copy of part of a drawing with its styles resolved to attributes; the frame round the reader's place goes, links too. */
export function resolved(source: Element): Element {
  const copy = source.cloneNode(true) as Element
  const copies = [copy, ...copy.querySelectorAll('*')]
  const passing: Element[] = []
  for (const [index, element] of [source, ...source.querySelectorAll('*')].entries()) {
    const target = copies[index]
    if (!target) continue
    const style = getComputedStyle(element)
    const carried = element.localName === 'text' ? ofTexts : shapes.has(element.localName) ? ofShapes : []
    for (const property of carried) {
      const value = style.getPropertyValue(property)
      if (value) target.setAttribute(property, value)
    }
    if (element.classList.contains('here')) passing.push(target)
    for (const { name } of [...target.attributes]) if (dropped.test(name)) target.removeAttribute(name)
  }
  for (const mark of passing) mark.remove()
  return copy
}

/**
 * Lays paths that a viewer would stretch from 0..100 out to their width in px, so that their strokes scale as all others do.
 * They are made of M and L with absolute points and of v.
 */
function unstretched(body: Element, width: number): void {
  for (const holder of body.querySelectorAll('svg[preserveAspectRatio="none"]')) {
    const share = Number.parseFloat(holder.parentElement?.closest('svg')?.getAttribute('width') ?? '100') / 100
    holder.removeAttribute('viewBox')
    holder.removeAttribute('preserveAspectRatio')
    for (const path of holder.querySelectorAll('path')) {
      const laid = (path.getAttribute('d') ?? '').replace(/([ML])(-?[\d.]+)[ ,]/g, (_, command: string, x: string) => `${command}${(Number(x) / 100 * share * width).toFixed(2)} `)
      path.setAttribute('d', laid)
      path.removeAttribute('vector-effect')
    }
  }
}

function made(name: string, attributes: Record<string, string | number>, text?: string): Element {
  const element = document.createElementNS(svg, name)
  for (const [key, value] of Object.entries(attributes)) element.setAttribute(key, String(value))
  if (text !== undefined) element.textContent = text
  return element
}

/** Ids that a drawing refers to by url(#id). */
const referred = (text: string) => new Set([...text.matchAll(/url\((?:&quot;|["'])?#([\w-]+)/g)].map(match => match[1] ?? ''))

export interface DrawingFile { text: string, width: number, height: number }

/**
 * The wide drawing of a chart as a file of its own: title and finding on top, colours resolved, the patterns it uses within.
 *
 * @param drawing the <svg> on the page, its lengths in px and per cent
 * @param words title, then the finding in lines
 * @param fonts CSS with the fonts that it needs
 * @param width the drawing's width in px, without the margin round it
 */
export function drawingFile(drawing: SVGSVGElement, words: { title: string, lines: readonly string[] }, fonts = '', width = 1000): DrawingFile {
  const page = getComputedStyle(document.documentElement)
  const [paper, ink] = [page.backgroundColor || 'white', page.color || 'black']
  const head = 40 + words.lines.length * 20
  const size = { width: width + margin * 2, height: Number(drawing.getAttribute('height')) + head + margin * 2 }
  const file = made('svg', { ...size, 'viewBox': `${-margin} ${-margin} ${size.width} ${size.height}`, 'font-family': family })

  const body = resolved(drawing)
  for (const [name, value] of Object.entries({ y: head, width, overflow: 'visible' })) body.setAttribute(name, String(value))
  unstretched(body, width)
  const defs = made('defs', {})
  if (fonts) defs.append(made('style', {}, fonts))
  for (const id of referred(body.outerHTML)) {
    const pattern = document.getElementById(id)
    if (pattern) defs.append(resolved(pattern))
  }
  file.append(
    made('title', {}, words.title), defs, made('rect', { x: -margin, y: -margin, ...size, fill: paper }),
    made('text', { 'y': 16, 'fill': ink, 'font-size': 21, 'font-weight': 600 }, words.title),
    ...words.lines.map((line, index) => made('text', { 'y': 42 + index * 20, 'fill': ink, 'font-size': 15 }, line)),
    body,
  )
  return { text: new XMLSerializer().serializeToString(file), ...size }
}

/** As `drawingFile`, with the page's own font within where it can be had. */
export async function drawingWithFonts(drawing: SVGSVGElement, words: { title: string, lines: readonly string[] }): Promise<DrawingFile> {
  return drawingFile(drawing, words, await embeddedFonts('Source Sans 3', ['400', '600']))
}

/** Hands a file to the reader's browser to keep. */
export function keepFile(name: string, content: Blob): void {
  const link = document.createElement('a')
  link.href = URL.createObjectURL(content)
  link.download = name
  link.click()
  setTimeout(() => URL.revokeObjectURL(link.href), 10_000)
}

/** An SVG's text as a PNG at twice its size, through a data: address, which the content policy admits. */
export async function pngOf(file: DrawingFile, times = 2): Promise<Blob> {
  const image = new Image()
  image.src = `data:image/svg+xml;charset=utf-8,${encodeURIComponent(file.text)}`
  await image.decode()
  const canvas = document.createElement('canvas')
  canvas.width = file.width * times
  canvas.height = file.height * times
  canvas.getContext('2d')?.drawImage(image, 0, 0, canvas.width, canvas.height)
  return new Promise((resolve, reject) => canvas.toBlob(blob => blob ? resolve(blob) : reject(new Error('The picture could not be made.')), 'image/png'))
}
