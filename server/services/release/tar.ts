const block = 512

/** A field of a header: octal digits with a closing NUL. */
const octal = (value: number, length: number) => `${value.toString(8).padStart(length - 1, '0')}\0`

function header(name: string, bytes: number, seconds: number): Buffer {
  if (Buffer.byteLength(name) > 100) throw new RangeError(`a name in an archive must be at most 100 bytes, got ${name}`)
  const head = Buffer.alloc(block)
  head.write(name, 0)
  head.write(octal(0o644, 8), 100)
  head.write(octal(0, 8), 108)
  head.write(octal(0, 8), 116)
  head.write(octal(bytes, 12), 124)
  head.write(octal(seconds, 12), 136)
  head.fill(' ', 148, 156)
  head.write('0', 156)
  head.write('ustar\x0000', 257, 'latin1')
  const sum = head.reduce((total, byte) => total + byte, 0)
  head.write(`${sum.toString(8).padStart(6, '0')}\0 `, 148)
  return head
}

/** An archive of regular files in the ustar format of POSIX.1-1988, all of one moment and nobody's: the same files give the same bytes. */
export function tar(files: readonly { name: string, body: Buffer }[], at: Date): Buffer {
  const seconds = Math.floor(at.getTime() / 1000)
  const parts = files.flatMap(({ name, body }) => [header(name, body.length, seconds), body, Buffer.alloc((block - body.length % block) % block)])
  return Buffer.concat([...parts, Buffer.alloc(2 * block)])
}
