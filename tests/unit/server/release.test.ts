import { execFileSync } from 'node:child_process'
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { releaseForm } from '../../../server/services/release/package'
import { column, fill, type Table } from '../../../server/services/release/table'
import { tar } from '../../../server/services/release/tar'

describe('the form of a release', () => {
  it('is the one that releases were made with: where this fails, releases that are out no longer build, so keep their form beside the new one', () => {
    expect(releaseForm()).toMatchInlineSnapshot(`"bf49603b23dafc54d54437836006e7c867a3e9f53b2bae8167bc38fa639a5f91"`)
  })
})

interface Row { name: string, number: number }
const table: Table<Row> = { name: 'rows', title: 'Rows', key: ['name', 'number'], columns: [column('name', 'string', 'name', row => row.name), column('number', 'integer', 'number', row => row.number, { optional: true })] }

describe('a table', () => {
  it('stands in the order of its keys whatever order its rows came in: text by code unit, numbers by size', () => {
    const rows = [{ name: 'b', number: 10 }, { name: 'b', number: 9 }, { name: 'a-1', number: 1 }, { name: 'a', number: 1 }, { name: 'Z', number: 1 }]
    const sorted = [['Z', 1], ['a', 1], ['a-1', 1], ['b', 9], ['b', 10]]
    expect(fill(table, rows).rows).toEqual(sorted)
    expect(fill(table, rows.toReversed()).rows).toEqual(sorted)
  })

  it('says of a field whether it must be filled', () => {
    expect(fill(table, []).fields).toEqual([{ name: 'name', type: 'string', description: 'name', constraints: { required: true } }, { name: 'number', type: 'integer', description: 'number' }])
  })
})

describe('an archive', () => {
  it('is read by GNU tar, names, bytes and moment, and is the same each time', () => {
    const folder = mkdtempSync(join(tmpdir(), 'tar-'))
    const files = [{ name: 'a/one.csv', body: Buffer.from('x'.repeat(512)) }, { name: 'a/two.csv', body: Buffer.from('øy\r\n') }, { name: 'a/none', body: Buffer.alloc(0) }]
    const archive = tar(files, new Date('2026-09-16T18:00:00Z'))
    writeFileSync(join(folder, 'a.tar'), archive)
    const listed = execFileSync('tar', ['--utc', '--full-time', '-tvf', 'a.tar'], { cwd: folder, encoding: 'utf8' })
    execFileSync('tar', ['-xf', 'a.tar'], { cwd: folder })
    expect(files.map(({ name }) => readFileSync(join(folder, name)).toString('hex'))).toEqual(files.map(({ body }) => body.toString('hex')))
    rmSync(folder, { recursive: true })
    expect(listed).toMatch(/^-rw-r--r-- 0\/0 +512 2026-09-16 18:00:00 a\/one\.csv$/m)
    expect(archive.equals(tar(files, new Date('2026-09-16T18:00:00Z')))).toBe(true)
    expect(archive.length % 512).toBe(0)
  })

  it('refuses a name that does not fit', () => {
    expect(() => tar([{ name: 'n'.repeat(101), body: Buffer.alloc(1) }], new Date(0))).toThrow(RangeError)
  })
})
