import { readChartNotation } from '#shared/seabed/notation'

/** What a seabed in chart notation says. */
export function notation(text: string) {
  return readChartNotation(text)
}
