// `npm run demo`: from a bare clone to a served demo world, and everything stopped again on Ctrl-C.
import { ensureNodeModules } from './host/packages.mjs'
import { builtServer, demoEnvironment, ensureBuild, holdLock, root, stamps } from './host/project.mjs'
import { openDatabase, serve } from './host/serve.mjs'
import { freePortNamed, say } from './host/shell.mjs'
import { runAndStop } from './host/stops.mjs'

await runAndStop(async () => {
  const port = await freePortNamed(process.env.PORT ?? '3000')
  holdLock('demo')
  await ensureNodeModules(root, stamps)
  await ensureBuild()
  const url = await openDatabase()
  return serve({
    command: process.execPath, args: [builtServer], env: demoEnvironment({ port, url }),
    banner: () => say(`\nKedgewise is ready: open http://localhost:${port}\nEvery design, place and boat in it is invented. Ctrl-C stops it and its database.\n`),
  })
})
