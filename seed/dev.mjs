// `npm run dev`: the same world behind Nuxt's development server.
import { join } from 'node:path'
import { ensureNodeModules } from './host/packages.mjs'
import { demoEnvironment, holdLock, root, stamps } from './host/project.mjs'
import { openDatabase, serve } from './host/serve.mjs'
import { portOrExit, say } from './host/shell.mjs'

const port = await portOrExit(process.env.PORT ?? '3000')
try {
  const release = holdLock('demo')
  process.on('exit', release)
  await ensureNodeModules(root, stamps)
  const database = await openDatabase()
  const env = { ...demoEnvironment({ port, url: database.url }), NODE_ENV: 'development' }
  process.exitCode = await serve({
    command: join(root, 'node_modules/.bin/nuxt'), args: ['dev', '--host', '127.0.0.1', '--port', String(port)], env, database,
    banner: () => say(`\nDeveloping at http://localhost:${port}\n`),
  })
}
catch (error) {
  console.error(error.message)
  process.exitCode = 1
}
