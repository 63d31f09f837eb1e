/** Everything written on the elevation, already in the reader's units. */
export interface ElevationLabels {
  load: string
  wind: string
  depth: string
  onBottom: string
  span: string
  shank: string
  keeps: string
}
