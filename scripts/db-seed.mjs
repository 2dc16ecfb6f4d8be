import { withDatabase } from './lib/app/database-task.mjs'

await withDatabase('npm run db:seed', async (database) => {
  const { migrateStep } = await import('./lib/app/database.mjs')
  const { accountLines, demoStep } = await import('./lib/app/demo.mjs')
  await migrateStep(database)
  const accounts = await demoStep(database.applicationUrl)
  console.log(accountLines(accounts).join('\n'))
})
