// `npm run demo`: from a bare clone to a served demo world, and everything stopped again on Ctrl-C.
import { ensureNodeModules } from './host/packages.mjs'
import { builtServer, demoEnvironment, ensureBuild, holdLock, root, stamps } from './host/project.mjs'
import { openDatabase, serve } from './host/serve.mjs'
import { portOrExit, say } from './host/shell.mjs'

const port = await portOrExit(process.env.PORT ?? '3000')
try {
  const release = holdLock('demo')
  process.on('exit', release)
  await ensureNodeModules(root, stamps)
  await ensureBuild()
  const database = await openDatabase()
  const env = demoEnvironment({ port, url: database.url })
  process.exitCode = await serve({
    command: process.execPath, args: [builtServer], env, database,
    banner: () => say(`\nKedgewise is ready: open http://localhost:${port}\nEvery design, place and boat in it is invented. Ctrl-C stops it and its database.\n`),
  })
}
catch (error) {
  console.error(error.message)
  process.exitCode = 1
}
