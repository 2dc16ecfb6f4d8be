import { expect, test } from '@playwright/test'
import { layOutAircraft, logRun, newPerson, open, openChannel, ready, register } from './support/pages'

test('two people edit one run: the second is told what changed and loses nothing', async ({
  page,
  context,
  isMobile,
}) => {
  await register(page, newPerson())
  await layOutAircraft(page, 'Shared project')
  await openChannel(page, 'EGT 1')
  await logRun(page)
  const other = await context.newPage()
  await open(other, page.url())

  await page.getByRole('button', { name: /Terminals of/ }).click()
  await page.getByRole('button', { name: 'Swap the legs here' }).click()
  if (isMobile) await page.getByRole('button', { name: 'Done' }).click()
  await page.getByRole('button', { name: 'Save the run' }).click()
  await expect(page.getByText('● Saved')).toBeVisible()

  await ready(other)
  await other.getByRole('button', { name: /^═? ?Extension/ }).click()
  await other.getByLabel('Cable').selectOption('J')
  if (isMobile) await other.getByRole('button', { name: 'Done' }).click()
  await other.getByRole('button', { name: 'Save the run' }).click()
  await expect(other.getByText(/saved this run in the meantime/)).toBeVisible()
  await expect(other.getByText('Type J pair (JP/JN)').first()).toBeVisible()

  await other.getByRole('button', { name: 'Save mine over theirs' }).click()
  await expect(other.getByText('● Saved')).toBeVisible()
})
