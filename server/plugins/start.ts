import { readConfiguration } from '../utils/configuration'
import { readLimits } from '../utils/limits'
import { log } from '../utils/log'
import { migrationsFolder } from '../utils/places'
import { startApplication, stopApplication } from '../services/application'

function configurationOrExit() {
  try {
    readLimits(process.env)
    return readConfiguration(process.env)
  }
  catch (error) {
    console.error((error as Error).message)
    process.exit(1)
  }
}

export default defineNitroPlugin((nitro) => {
  if (import.meta.prerender) return
  const { databaseUrl } = configurationOrExit()
  startApplication(databaseUrl, migrationsFolder(), (error) => {
    log.error('the database refused the migrations', { error: error.message })
    process.exit(1)
  })
  nitro.hooks.hook('close', stopApplication)
})
