import { dirname, join, resolve } from 'node:path'

// Built: next to index.mjs. In development: where the sources and the last preparation lie.
const serverFolder = () => import.meta.dev ? null : dirname(resolve(process.argv[1] ?? '.'))

/** The folder of the generated migrations. */
export const migrationsFolder = () => join(serverFolder() ?? process.cwd(), 'drizzle')

/** The file of a worker thread's entry, built beside the server. */
export const workerFile = (name: string) => join(serverFolder() ?? join(process.cwd(), '.nuxt'), 'workers', `${name}.mjs`)
