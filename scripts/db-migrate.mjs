import { withDatabase } from './lib/app/database-task.mjs'

await withDatabase('npm run db:migrate', async (database) => {
  const { migrateStep } = await import('./lib/app/database.mjs')
  await migrateStep(database)
})
