import { Socket, isIP } from 'node:net'
import { getRequestHeader, type H3Event } from 'h3'

/** A call that our own rendering makes, without a socket: the page itself has been counted. A socket that has closed is still a socket. */
export function isInternal(event: H3Event): boolean {
  return !(event.node.req.socket instanceof Socket)
}

/** An IPv6 address as eight numbers; handles `::` and a dotted IPv4 tail. */
function groupsOf(address: string): number[] {
  const dotted = /^(.*:)(\d+)\.(\d+)\.(\d+)\.(\d+)$/.exec(address)
  const hex = (high = '0', low = '0') => (Number(high) * 256 + Number(low)).toString(16)
  const text = dotted ? `${dotted[1]}${hex(dotted[2], dotted[3])}:${hex(dotted[4], dotted[5])}` : address
  const [head = '', tail] = text.split('::')
  const numbers = (part: string) => part === '' ? [] : part.split(':').map(group => Number.parseInt(group, 16))
  const left = numbers(head)
  if (tail === undefined) return left
  const right = numbers(tail)
  return [...left, ...Array<number>(8 - left.length - right.length).fill(0), ...right]
}

/**
 * What one client is counted by: an IPv4 address, or the /64 that an IPv6 client can roam in. IPv4 dressed as IPv6 counts as IPv4.
 *
 * @returns null for what is not an address
 */
export function clientKey(address: string): string | null {
  const bare = address.trim().replace(/^\[(.*)\]$/, '$1').replace(/%.*$/, '')
  const kind = isIP(bare)
  if (kind === 0) return null
  if (kind === 4) return bare
  const groups = groupsOf(bare)
  if (groups.slice(0, 5).every(group => group === 0) && groups[5] === 0xFFFF) {
    return groups.slice(6).flatMap(group => [group >> 8, group & 255]).join('.')
  }
  return `${groups.slice(0, 4).map(group => group.toString(16)).join(':')}::/64`
}

/**
 * The address that counts: the peer's, or behind so many trusted proxies the entry of X-Forwarded-For that the outermost of them wrote.
 * Entries further left are the client's own words and are never believed; with no proxy trusted the header is not looked at.
 */
export function clientAddress(peer: string | undefined, forwardedFor: string | undefined, trustedProxies: number): string {
  const named = trustedProxies > 0 && forwardedFor ? forwardedFor.split(',').map(entry => entry.trim()) : []
  const hops = [...named, peer ?? '']
  const chosen = hops[Math.max(0, hops.length - 1 - trustedProxies)] ?? ''
  return clientKey(chosen) ?? clientKey(peer ?? '') ?? 'unknown'
}

export function clientOf(event: H3Event, trustedProxies: number): string {
  return clientAddress(event.node.req.socket.remoteAddress, getRequestHeader(event, 'x-forwarded-for'), trustedProxies)
}
