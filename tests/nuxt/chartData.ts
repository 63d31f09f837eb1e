import type { LadderBand, LadderPoint, LadderRow, MatrixColumn, MatrixRow, RatioRow, StripRow } from '~/utils/chart/types'

// Invented rows, small enough to check by hand.
export const strips: StripRow[] = [
  {
    id: 'tern', label: 'Tern, 20 kg', note: '3 pulls on 2 days', median: 5, low50: 4.4, high50: 5.6, low90: 3.5, high90: 7, n: 3, pattern: 'seabed-loose-sand',
    pulls: [{ value: 6, atLimit: false }, { value: 4, atLimit: false }, { value: 9, atLimit: true }],
  },
  { id: 'merle', label: 'Merle, 20 kg', median: 2, low50: 1.5, high50: 2.7, low90: 0.4, high90: 11, n: 0, dashed: true, pulls: [] },
]
export const curve: LadderPoint[] = [0, 10, 20, 30, 40].map(wind => ({ wind, load: wind * wind / 100 }))
export const holdings: LadderRow[] = [
  { label: 'Tern', holding: 9, wind: 30, atLeast: false },
  { label: 'Merle', holding: 40, wind: 40, atLeast: true },
  { label: 'Hook', holding: 0.1, wind: null, atLeast: false },
]
export const bands: LadderBand[] = [{ from: 22, to: 28, label: 'F6' }, { from: 28, to: 34, label: 'F7' }]
export const columns: MatrixColumn[] = [{ label: 'loose sand', pattern: 'seabed-loose-sand' }, { label: 'silt', pattern: 'seabed-silt' }]
export const matrix: MatrixRow[] = [
  { label: 'Tern', href: '/designs/tern', cells: [{ text: '5.0 kN', level: 4, n: 3 }, null] },
  { label: 'Merle', cells: [null, null] },
]
export const ratios: RatioRow[] = [
  { label: 'loose sand', ratio: 1.01, low90: 0.9, high90: 1.13, n: 24, verdict: 'no difference that matters' },
  { label: 'firm mud', ratio: 1.32, low90: 1.12, high90: 1.55, n: 16, verdict: 'better' },
]
export const oneDecimal = (value: number): string => value.toFixed(1)
