const faces = (family: string, weights: readonly string[]): CSSFontFaceRule[] =>
  [...document.styleSheets].flatMap(sheet => rulesOf(sheet)).filter((rule): rule is CSSFontFaceRule =>
    rule instanceof CSSFontFaceRule
    && rule.style.getPropertyValue('font-family').replaceAll(/["']/g, '') === family
    && weights.includes(rule.style.getPropertyValue('font-weight')))

/** A sheet of another origin keeps its rules to itself. */
function rulesOf(sheet: CSSStyleSheet): CSSRule[] {
  try {
    return [...sheet.cssRules]
  }
  catch {
    return []
  }
}

const asDataAddress = (blob: Blob): Promise<string> => new Promise((resolve, reject) => {
  const reader = new FileReader()
  reader.onload = () => resolve(String(reader.result))
  reader.onerror = () => reject(new Error('The font could not be read.'))
  reader.readAsDataURL(blob)
})

/**
 * The page's own font faces of a family as CSS with their files within, so that a saved drawing looks the same elsewhere; empty where
 * they cannot be had: the drawing then falls back to another sans-serif.
 */
export async function embeddedFonts(family: string, weights: readonly string[]): Promise<string> {
  const parts = await Promise.all(faces(family, weights).map(async (face) => {
    const path = /url\(["']?([^"')]+\.woff2[^"')]*)/.exec(face.style.getPropertyValue('src'))?.[1]
    if (!path) return ''
    try {
      const answer = await fetch(new URL(path, face.parentStyleSheet?.href ?? document.baseURI))
      const address = await asDataAddress(new Blob([await answer.arrayBuffer()], { type: 'font/woff2' }))
      return answer.ok ? `@font-face{font-family:'${family}';font-weight:${face.style.getPropertyValue('font-weight')};src:url(${address}) format('woff2')}` : ''
    }
    catch {
      return ''
    }
  }))
  return parts.join('')
}
