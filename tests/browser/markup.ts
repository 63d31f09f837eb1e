const voids = new Set(['area', 'base', 'br', 'col', 'embed', 'hr', 'img', 'input', 'link', 'meta', 'source', 'track', 'wbr'])
const phrasing = new Set(['a', 'button', 'label', 'p', 'h1', 'h2', 'h3', 'h4', 'span'])
const blocks = new Set(['p', 'div', 'ul', 'ol', 'dl', 'table', 'section', 'form', 'details', 'h1', 'h2', 'h3', 'h4', 'figure'])
const interactive = new Set(['a', 'button', 'select', 'textarea', 'label', 'summary'])

/** What is wrong with a served page: tags that do not close, what may not stand inside what, ids that stand twice, references to none. */
export function markupFaults(html: string): string[] {
  const faults: string[] = []
  const text = html.replace(/<!--[\s\S]*?-->/g, '').replace(/<(script|style|textarea)\b([^>]*)>[\s\S]*?<\/\1>/g, '<$1$2></$1>')
  if (!/^<!doctype html>/i.test(text)) faults.push('no doctype')
  const open: string[] = []
  for (const [, close, name = '', , self] of text.matchAll(/<(\/?)([a-zA-Z][\w-]*)((?:"[^"]*"|'[^']*'|[^'">])*?)(\/?)>/g)) {
    const tag = name.toLowerCase()
    if (close) {
      const last = open.pop()
      if (last !== tag) return [...faults, `</${tag}> closes <${last}>`]
      continue
    }
    const above = open.at(-1) ?? ''
    if (phrasing.has(above) && above !== 'a' && above !== 'label' && blocks.has(tag)) faults.push(`<${tag}> inside <${above}>`)
    if (interactive.has(tag) && open.some(outer => ['a', 'button'].includes(outer))) faults.push(`<${tag}> inside a link or button`)
    if (tag === 'form' && open.includes('form')) faults.push('a form inside a form')
    if (['td', 'th'].includes(tag) && above !== 'tr') faults.push(`<${tag}> inside <${above}>`)
    if (tag === 'tr' && !['thead', 'tbody', 'tfoot'].includes(above)) faults.push(`<tr> inside <${above}>`)
    if (tag === 'li' && !['ul', 'ol'].includes(above)) faults.push(`<li> inside <${above}>`)
    if (['dt', 'dd'].includes(tag) && !['dl', 'div'].includes(above)) faults.push(`<${tag}> inside <${above}>`)
    if (!self && !voids.has(tag)) open.push(tag)
  }
  faults.push(...open.map(tag => `<${tag}> never closes`))
  const ids = [...text.matchAll(/\sid="([^"]*)"/g)].map(([, id]) => id)
  faults.push(...ids.filter((id, index) => ids.indexOf(id) !== index).map(id => `id ${id} stands twice`))
  const known = new Set(ids)
  for (const [, attribute, names = ''] of text.matchAll(/\s(for|aria-labelledby|aria-describedby)="([^"]*)"/g)) {
    faults.push(...names.split(' ').filter(name => !known.has(name)).map(name => `${attribute} names ${name}, which is not there`))
  }
  if ((text.match(/<h1[\s>]/g) ?? []).length !== 1) faults.push('not one h1')
  return faults
}
