import { defineNitroPlugin, useRuntimeConfig } from '#imports'
import { closeDatabase, openDatabase } from '~~/server/db/client'

/** One pool for the life of the process. */
export default defineNitroPlugin((nitro) => {
  const { databaseUrl } = useRuntimeConfig()
  if (!databaseUrl)
    throw new Error('NUXT_DATABASE_URL is not set: the application has no database to work on.')
  openDatabase(databaseUrl)
  nitro.hooks.hook('close', closeDatabase)
})
