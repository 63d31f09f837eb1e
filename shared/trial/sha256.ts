/** SHA-256 of a text (FIPS 180-4), for naming data by their content where no platform digest is at hand. */

function isPrime(n: number): boolean {
  for (let d = 2; d * d <= n; d++) if (n % d === 0) return false
  return true
}

/** First 32 bits of the fractional part. */
function fraction(x: number): number {
  return Math.floor((x - Math.floor(x)) * 2 ** 32) | 0
}

const primes: number[] = []
for (let n = 2; primes.length < 64; n++) if (isPrime(n)) primes.push(n)

/** Constants of the standard: cube roots of the first 64 primes; square roots of the first 8. */
const roundConstants = Int32Array.from(primes, p => fraction(Math.cbrt(p)))
const startState = Int32Array.from(primes.slice(0, 8), p => fraction(Math.sqrt(p)))

function rotate(x: number, by: number): number {
  return (x >>> by) | (x << (32 - by))
}

function padded(bytes: Uint8Array): DataView {
  const length = Math.ceil((bytes.length + 9) / 64) * 64
  const block = new Uint8Array(length)
  block.set(bytes)
  block[bytes.length] = 0x80
  const view = new DataView(block.buffer)
  view.setUint32(length - 8, Math.floor(bytes.length / 2 ** 29))
  view.setUint32(length - 4, (bytes.length << 3) >>> 0)
  return view
}

function schedule(view: DataView, at: number, words: Int32Array): void {
  for (let i = 0; i < 16; i++) words[i] = view.getInt32(at + 4 * i)
  for (let i = 16; i < 64; i++) {
    const a = words[i - 15]!
    const b = words[i - 2]!
    const s0 = rotate(a, 7) ^ rotate(a, 18) ^ (a >>> 3)
    const s1 = rotate(b, 17) ^ rotate(b, 19) ^ (b >>> 10)
    words[i] = words[i - 16]! + s0 + words[i - 7]! + s1
  }
}

function compress(state: Int32Array, words: Int32Array): void {
  const v = Array.from(state)
  for (let i = 0; i < 64; i++) {
    const [a, b, c, d, e, f, g, h] = v as [number, number, number, number, number, number, number, number]
    const choice = (e & f) ^ (~e & g)
    const t1 = (h + (rotate(e, 6) ^ rotate(e, 11) ^ rotate(e, 25)) + choice + roundConstants[i]! + words[i]!) | 0
    const t2 = ((rotate(a, 2) ^ rotate(a, 13) ^ rotate(a, 22)) + ((a & b) ^ (a & c) ^ (b & c))) | 0
    v.pop()
    v.unshift((t1 + t2) | 0)
    v[4] = (d + t1) | 0
  }
  v.forEach((value, i) => (state[i]! += value))
}

/**
 * SHA-256 of a text's UTF-8 bytes, as 64 lower-case hexadecimal digits.
 */
export function sha256(text: string): string {
  const view = padded(new TextEncoder().encode(text))
  const state = startState.slice()
  const words = new Int32Array(64)
  for (let at = 0; at < view.byteLength; at += 64) {
    schedule(view, at, words)
    compress(state, words)
  }
  return Array.from(state, word => (word >>> 0).toString(16).padStart(8, '0')).join('')
}
