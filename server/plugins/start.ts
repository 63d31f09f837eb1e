import { ConfigurationError, readConfiguration } from '../utils/configuration'
import { log } from '../utils/log'
import { migrationsFolder } from '../utils/places'
import { startApplication, stopApplication } from '../services/application'

function configurationOrExit() {
  try {
    return readConfiguration(process.env)
  }
  catch (error) {
    if (!(error instanceof ConfigurationError)) throw error
    console.error(error.message)
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
