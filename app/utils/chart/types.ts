/** What the charts draw: plain numbers in the units that the reader sees, words from the caller. */

/** A column of the table of numbers beneath a chart; the unit stands in its header. */
export interface ChartColumn { key: string, label: string, unit?: string, align?: 'left' | 'right' }

/** A row of that table by column key; null prints as a dash and leaves its CSV field empty. */
export type ChartTableRow = Record<string, string | number | null>

/** One pull: the highest load it held; at the limit (of the rig, as a rule) it never moved and would have held more. */
export interface StripPull { value: number, atLimit: boolean }

export interface StripRow {
  id: string
  label: string
  /** A few words beneath the label: "12 pulls on 4 days". */
  note?: string
  median: number
  low50: number
  high50: number
  low90: number
  high90: number
  n: number
  /** Thin evidence: dashed, without the 50 % interval. */
  dashed?: boolean
  /** Id of an SVG pattern that stands on the page. */
  pattern?: string
  pulls: readonly StripPull[]
}

export interface LadderPoint { wind: number, load: number }

/** A holding and the wind at which the load reaches it; null: no wind that the chart shows; atLeast: holds at every wind shown. */
export interface LadderRow { label: string, holding: number, wind: number | null, atLeast: boolean }

export interface LadderBand { from: number, to: number, label: string }

export interface MatrixColumn { label: string, pattern?: string }

/** A figure in words, how dark its cell is drawn (0 weakest to 4 strongest), and the pulls behind it. */
export interface MatrixCell { text: string, level: 0 | 1 | 2 | 3 | 4, n: number }

export interface MatrixRow { label: string, href?: string, cells: readonly (MatrixCell | null)[] }

export interface RatioRow { label: string, pattern?: string, ratio: number, low90: number, high90: number, n: number, verdict: string }
