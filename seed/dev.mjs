// `npm run dev`: the same world behind Nuxt's development server.
import { join } from 'node:path'
import { ensureNodeModules } from './host/packages.mjs'
import { demoEnvironment, holdLock, root, stamps } from './host/project.mjs'
import { openDatabase, serve } from './host/serve.mjs'
import { freePortNamed, say } from './host/shell.mjs'
import { runAndStop } from './host/stops.mjs'

await runAndStop(async () => {
  const port = await freePortNamed(process.env.PORT ?? '3000')
  holdLock('demo')
  await ensureNodeModules(root, stamps)
  const url = await openDatabase()
  return serve({
    command: join(root, 'node_modules/.bin/nuxt'), args: ['dev', '--host', '127.0.0.1', '--port', String(port)],
    env: { ...demoEnvironment({ port, url }), NODE_ENV: 'development' },
    banner: () => say(`\nDeveloping at http://localhost:${port}\n`),
  })
})
