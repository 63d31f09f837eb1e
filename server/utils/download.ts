import { Readable } from 'node:stream'
import { getRequestHeader, sendNoContent, sendStream, setResponseHeaders, setResponseStatus, type H3Event } from 'h3'

export interface Download { name: string, body: Buffer, sha256: string, open: boolean }

const types: Readonly<Record<string, string>> = {
  csv: 'text/csv; charset=utf-8; header=present',
  json: 'application/json; charset=utf-8',
  tar: 'application/x-tar',
}

const pieceBytes = 64 * 1024

function* pieces(body: Buffer) {
  for (let start = 0; start < body.length; start += pieceBytes) yield body.subarray(start, start + pieceBytes)
}

const names = (header: string, etag: string) => header.split(',').some(one => one.trim().replace(/^W\//, '') === etag || one.trim() === '*')

/** Sends a file piece by piece, to be saved under its name. What is open to everybody never changes and may be kept for good. */
export function sendFile(event: H3Event, { name, body, sha256, open }: Download): Promise<void> | void {
  const etag = `"${sha256}"`
  setResponseHeaders(event, { 'ETag': etag, 'Cache-Control': open ? 'public, max-age=31536000, immutable' : 'private, no-store' })
  if (names(getRequestHeader(event, 'if-none-match') ?? '', etag)) return sendNoContent(event, 304)
  setResponseStatus(event, 200)
  setResponseHeaders(event, {
    'Content-Type': types[name.slice(name.lastIndexOf('.') + 1)] ?? 'application/octet-stream',
    'Content-Length': body.length,
    'Content-Disposition': `attachment; filename="${name}"`,
  })
  return sendStream(event, Readable.from(pieces(body), { objectMode: false }))
}
