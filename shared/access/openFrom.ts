/** A release is open to everybody, under its licence, once its data are this old. */
export const openAfterMonths = 12

/** The moment from which on a release is open: twelve months after its data were cut, in UTC. */
export function openFrom(cutAt: string): string {
  const day = new Date(cutAt)
  day.setUTCMonth(day.getUTCMonth() + openAfterMonths)
  return day.toISOString()
}

/** Whether a release with data up to `cutAt` is open at the moment `now`. */
export function isOpen(cutAt: string, now: Date): boolean {
  return new Date(openFrom(cutAt)) <= now
}
