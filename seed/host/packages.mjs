// What a bare Debian machine lacks: PostgreSQL, Chromium for the browser tests, and the npm packages.
import { createHash } from 'node:crypto'
import { existsSync, readFileSync, readdirSync } from 'node:fs'
import { join } from 'node:path'
import { isRoot, run, say, succeeds } from './shell.mjs'

const pgRoot = '/usr/lib/postgresql'

/** The folder that holds initdb and pg_ctl of the newest PostgreSQL on this machine, or null. */
export function postgresBin() {
  const versions = existsSync(pgRoot) ? readdirSync(pgRoot).sort((a, b) => Number(b) - Number(a)) : []
  const folders = [...versions.map(version => join(pgRoot, version, 'bin')), '/usr/local/pgsql/bin', '/usr/local/bin', '/usr/bin']
  return folders.find(folder => existsSync(join(folder, 'initdb')) && existsSync(join(folder, 'pg_ctl'))) ?? null
}

async function asRoot(command, args) {
  const env = ['DEBIAN_FRONTEND=noninteractive']
  if (isRoot()) return run('env', [...env, command, ...args])
  if (!await succeeds('sudo', ['--version'])) {
    throw new Error(`${command} needs root: install sudo and allow this user, or run as root: ${command} ${args.join(' ')}`)
  }
  // A password may be asked for: the terminal is handed on.
  return run('sudo', ['env', ...env, command, ...args], { stdio: 'inherit' })
}

async function installDebian(names) {
  if (!await succeeds('apt-get', ['--version'])) {
    throw new Error(`apt-get was not found: install ${names.join(', ')} by hand and start again`)
  }
  say(`Installing ${names.join(', ')} from Debian's packages`)
  await asRoot('apt-get', ['update', '-qq'])
  await asRoot('apt-get', ['install', '-y', '-qq', '--no-install-recommends', ...names])
}

/** Makes sure PostgreSQL's server is installed; hands back the folder of its programs. */
export async function ensurePostgres() {
  const found = postgresBin()
  if (found) return found
  // Debian would start a cluster of its own on port 5432: only the programs are wanted.
  await asRoot('sh', ['-c', 'mkdir -p /etc/postgresql-common/createcluster.d && echo "create_main_cluster = false" > /etc/postgresql-common/createcluster.d/kedgewise.conf'])
  await installDebian(['postgresql'])
  const bin = postgresBin()
  if (!bin) throw new Error('PostgreSQL was installed, but initdb and pg_ctl were not found under /usr/lib/postgresql')
  return bin
}

/** Makes sure Debian's Chromium is installed; hands back its path. */
export async function ensureChromium() {
  const path = '/usr/bin/chromium'
  if (!existsSync(path)) await installDebian(['chromium'])
  return path
}

/** Runs `npm ci` unless node_modules was installed from this very lock file. */
export async function ensureNodeModules(root, stamps) {
  const lock = createHash('sha256').update(readFileSync(join(root, 'package-lock.json'))).digest('hex')
  const mark = join(root, 'node_modules', '.package-lock.json')
  if (existsSync(mark) && stamps.get('install') === lock) return
  if (existsSync(mark) && await succeeds('npm', ['ls', '--all', '--silent'], { cwd: root, maxBuffer: 1 << 26 })) {
    stamps.set('install', lock)
    return
  }
  say('Installing the npm packages (npm ci)')
  await run('npm', ['ci', '--no-audit', '--no-fund'], { cwd: root })
  stamps.set('install', lock)
}
