/** What is copied from the page's styles into a saved drawing, so that it stands without them. */
const carried = ['fill', 'fill-opacity', 'stroke', 'stroke-width', 'stroke-dasharray', 'stroke-linecap', 'stroke-linejoin', 'stroke-opacity', 'opacity',
  'font-family', 'font-size', 'font-weight', 'font-style', 'text-anchor', 'vector-effect', 'visibility'] as const

const svg = 'http://www.w3.org/2000/svg'

/** Copies an element of a drawing with its styles resolved to attributes; class and style go, data attributes too. */
function resolved(source: Element): Element {
  const copy = source.cloneNode(true) as Element
  const sources = [source, ...source.querySelectorAll('*')]
  const copies = [copy, ...copy.querySelectorAll('*')]
  sources.forEach((element, index) => {
    const target = copies[index]
    if (!target) return
    const style = getComputedStyle(element)
    for (const property of carried) {
      const value = style.getPropertyValue(property)
      if (value) target.setAttribute(property, value)
    }
    for (const { name } of [...target.attributes]) {
      if (name === 'class' || name === 'style' || name === 'tabindex' || name.startsWith('data-') || name.startsWith('aria-')) target.removeAttribute(name)
    }
  })
  copy.querySelectorAll('.here, [data-here]').forEach(mark => mark.remove())
  return copy
}

/** Ids that a drawing refers to by url(#id). */
const referred = (text: string) => new Set([...text.matchAll(/url\((?:&quot;|["'])?#([\w-]+)/g)].map(match => match[1] ?? ''))

function textLine(text: string, y: number, size: number, weight: number, ink: string): Element {
  const line = document.createElementNS(svg, 'text')
  for (const [name, value] of Object.entries({ 'x': 0, y, 'fill': ink, 'font-family': 'Source Sans 3, system-ui, sans-serif', 'font-size': size, 'font-weight': weight })) line.setAttribute(name, String(value))
  line.textContent = text
  return line
}

/**
 * The wide drawing of a chart as a file of its own: title and finding on top, colours resolved, the patterns it uses within.
 *
 * @param drawing the <svg> on the page, its lengths in px and per cent
 * @param words title, then the finding in lines
 * @returns the SVG's text, its width and height in px
 */
export function drawingFile(drawing: SVGSVGElement, words: { title: string, lines: readonly string[] }, width = 1000): { text: string, width: number, height: number } {
  const style = getComputedStyle(document.documentElement)
  const [paper, ink] = [style.backgroundColor || 'white', style.color || 'black']
  const head = 34 + words.lines.length * 20
  const drawn = Number(drawing.getAttribute('height'))
  const margin = 24
  const file = document.createElementNS(svg, 'svg')
  const height = drawn + head + margin * 2
  for (const [name, value] of Object.entries({ width: width + margin * 2, height, viewBox: `${-margin} ${-margin} ${width + margin * 2} ${height}` })) file.setAttribute(name, String(value))

  const body = resolved(drawing)
  body.setAttribute('y', String(head))
  body.setAttribute('width', String(width))
  body.setAttribute('overflow', 'visible')
  const defs = document.createElementNS(svg, 'defs')
  for (const id of referred(body.outerHTML)) {
    const pattern = body.querySelector(`[id="${id}"]`) ? null : document.getElementById(id)
    if (pattern) defs.append(resolved(pattern))
  }
  const ground = document.createElementNS(svg, 'rect')
  for (const [name, value] of Object.entries({ x: -margin, y: -margin, width: width + margin * 2, height, fill: paper })) ground.setAttribute(name, String(value))
  const name = document.createElementNS(svg, 'title')
  name.textContent = words.title
  file.append(name, defs, ground, textLine(words.title, 16, 20, 600, ink), ...words.lines.map((line, index) => textLine(line, 42 + index * 20, 15, 400, ink)), body)
  return { text: new XMLSerializer().serializeToString(file), width: width + margin * 2, height }
}

/** Hands a file to the reader's browser to keep. */
export function keepFile(name: string, content: Blob): void {
  const link = document.createElement('a')
  link.href = URL.createObjectURL(content)
  link.download = name
  link.click()
  setTimeout(() => URL.revokeObjectURL(link.href), 10_000)
}

/** An SVG's text as a PNG at twice its size. */
export async function pngOf(file: { text: string, width: number, height: number }, times = 2): Promise<Blob> {
  const image = new Image()
  image.src = `data:image/svg+xml;charset=utf-8,${encodeURIComponent(file.text)}`
  await image.decode()
  const canvas = document.createElement('canvas')
  canvas.width = file.width * times
  canvas.height = file.height * times
  canvas.getContext('2d')?.drawImage(image, 0, 0, canvas.width, canvas.height)
  return new Promise((resolve, reject) => canvas.toBlob(blob => blob ? resolve(blob) : reject(new Error('The picture could not be made.')), 'image/png'))
}
