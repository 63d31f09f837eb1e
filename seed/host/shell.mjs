// Running other programs: nothing here needs an installed package, so that a bare clone can start.
import { execFile, spawn } from 'node:child_process'
import { createServer } from 'node:net'
import { promisify } from 'node:util'

const execFileAsync = promisify(execFile)

export const isRoot = () => process.getuid?.() === 0

/** Runs a program to its end with its output shown; rejects, naming the command, when it fails. */
export function run(command, args, options = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { stdio: ['ignore', 'inherit', 'inherit'], ...options })
    child.on('error', error => reject(new Error(`${command}: ${error.message}`)))
    child.on('exit', (code, signal) => code === 0
      ? resolve()
      : reject(new Error(`${command} ${args.join(' ')} ended with ${signal ?? `code ${code}`}`)))
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

/** The port named by PORT, if it is a port and free; otherwise says so and ends. */
export async function portOrExit(text) {
  const port = Number(text)
  if (!Number.isInteger(port) || port < 1 || port > 65535) {
    console.error(`PORT is ${text}: a whole number from 1 to 65535 is needed`)
    process.exit(1)
  }
  if (!await isFree(port)) {
    console.error(`Port ${port} is taken: set PORT to another, e.g. PORT=3001 npm run demo`)
    process.exit(1)
  }
  return port
}
