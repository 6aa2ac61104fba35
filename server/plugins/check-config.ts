import { config, ConfigError } from '#server/utils/config'

/** Stops a process that is badly set up before it answers its first request. */
export default defineNitroPlugin(() => {
  // The build renders no pages, but a prerenderer would load plugins without an environment.
  if (import.meta.prerender) return
  try {
    config()
  }
  catch (error) {
    if (!(error instanceof ConfigError)) throw error
    console.error(error.message)
    process.exit(1)
  }
})
