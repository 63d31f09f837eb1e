// Running other programs: nothing here needs an installed package, so that a bare clone can start.
import { execFile, spawn } from 'node:child_process'
import { createServer } from 'node:net'
import { promisify } from 'node:util'
import { onStop } from './stops.mjs'

const execFileAsync = promisify(execFile)

export const isRoot = () => process.getuid?.() === 0

/** Asks a child process to end, insists after ten seconds, and waits until it has. */
export async function endChild(child) {
  if (child.exitCode !== null || child.signalCode !== null || child.pid === undefined) return
  const ended = new Promise(resolve => child.once('exit', resolve))
  child.kill('SIGTERM')
  const timer = setTimeout(() => child.kill('SIGKILL'), 10_000)
  await ended
  clearTimeout(timer)
}

/** Runs a program to its end with its output shown; rejects, naming the command, when it fails. Ended when everything is stopped. */
export function run(command, args, options = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { stdio: ['ignore', 'inherit', 'inherit'], ...options })
    const forget = onStop(() => endChild(child))
    child.on('error', (error) => {
      forget()
      reject(new Error(`${command}: ${error.message}`))
    })
    child.on('exit', (code, signal) => {
      forget()
      if (code === 0) resolve()
      else reject(new Error(`${command} ${args.join(' ')} ended with ${signal ?? `code ${code}`}`))
    })
  })
}

/** Runs a program to its end and hands back what it printed. */
export async function read(command, args, options = {}) {
  const { stdout } = await execFileAsync(command, args, options)
  return stdout.trim()
}

/** Whether a program runs to success; its output is thrown away. */
export async function succeeds(command, args, options = {}) {
  try {
    await execFileAsync(command, args, options)
    return true
  }
  catch {
    return false
  }
}

/** A port that is free on 127.0.0.1 now. */
export function freePort() {
  return new Promise((resolve, reject) => {
    const server = createServer()
    server.on('error', reject)
    server.listen(0, '127.0.0.1', () => {
      const { port } = server.address()
      server.close(() => resolve(port))
    })
  })
}

export const pause = ms => new Promise(resolve => setTimeout(resolve, ms))

export const say = text => process.stdout.write(`${text}\n`)

/** Whether a process with this number is alive. */
export function alive(pid) {
  try {
    process.kill(pid, 0)
    return true
  }
  catch (error) {
    return error.code === 'EPERM'
  }
}

function isFree(port) {
  return new Promise((resolve) => {
    const server = createServer()
    server.on('error', () => resolve(false))
    server.listen(port, '127.0.0.1', () => server.close(() => resolve(true)))
  })
}

/** The port named by PORT; throws where it is no port, or taken. */
export async function freePortNamed(text) {
  const port = Number(text)
  if (!Number.isInteger(port) || port < 1 || port > 65535) throw new Error(`PORT is ${text}: a whole number from 1 to 65535 is needed`)
  if (!await isFree(port)) throw new Error(`Port ${port} is taken: set PORT to another, e.g. PORT=3001 npm run demo`)
  return port
}
