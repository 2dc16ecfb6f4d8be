import { expect, test } from '@playwright/test'
import { layOutAircraft, logRun, newPerson, openChannel, ready, register } from './support/pages'

test('from an empty account to a copper extension explained', async ({ page, isMobile }) => {
  await register(page, newPerson())
  await expect(page.getByText('No aircraft yet')).toBeVisible()
  await layOutAircraft(page, 'First project')
  await expect(page.getByRole('heading', { name: 'What to do next' })).toBeVisible()
  await openChannel(page, 'EGT 2')

  await test.step('log the probe', async () => {
    await page.getByRole('link', { name: 'Log the probe' }).click()
    await page.getByLabel('Marking or serial number').fill('E-2')
    await page.getByRole('button', { name: 'Save the probe' }).click()
    await expect(page.getByText('E-2, type K')).toBeVisible()
  })

  await test.step('log the run as intended', async () => {
    await logRun(page)
    await page.getByRole('link', { name: 'To the channel sheet' }).click()
    await expect(page.getByText('Nothing found in the record')).toBeVisible()
    await expect(page.getByText('As intended', { exact: true })).toBeVisible()
  })

  await test.step('make the extension copper', async () => {
    await page.getByRole('link', { name: 'Edit the run' }).click()
    await page.getByRole('button', { name: /^═? ?Extension/ }).click()
    await page.getByLabel('Cable').selectOption('copper')
    if (isMobile) await page.getByRole('button', { name: 'Done' }).click()
    await expect(page.getByRole('heading', { name: 'Error by cause' })).toBeVisible()
    await page.getByRole('button', { name: 'Save the run' }).click()
    await expect(page.getByText('● Saved')).toBeVisible()
  })

  await test.step('read why', async () => {
    await page.getByRole('link', { name: 'To the channel sheet' }).click()
    await expect(page.getByText('Fault found', { exact: true })).toBeVisible()
    await expect(
      page
        .getByText(/stray junction/i)
        .filter({ visible: true })
        .first(),
    ).toBeVisible()
    await expect(
      page
        .getByText(/KP \(nickel-chromium\)/)
        .filter({ visible: true })
        .first(),
    ).toBeVisible()
  })

  await test.step('and find the same after a reload and in the table', async () => {
    await page.reload()
    await ready(page)
    await expect(page.getByText('Fault found', { exact: true })).toBeVisible()
    await page.getByRole('link', { name: 'Channels', exact: true }).click()
    await expect(page.getByText(/wrong conductor, stray junction/).filter({ visible: true })).toBeVisible()
  })
})

test('legs swapped at the terminals drive the display off scale, and say so', async ({ page, isMobile }) => {
  await register(page, newPerson())
  await layOutAircraft(page, 'Swapped project')
  await openChannel(page, 'CHT 1')
  await logRun(page)
  await page.getByRole('button', { name: /Terminals of Engine display/ }).click()
  await page.getByRole('button', { name: 'Swap the legs here' }).click()
  if (isMobile) await page.getByRole('button', { name: 'Done' }).click()
  await page.getByRole('radio', { name: /Climb/ }).check({ force: true })
  await expect(
    page
      .getByText(/legs swapped/i)
      .filter({ visible: true })
      .first(),
  ).toBeVisible()
  await page.getByRole('button', { name: 'Undo' }).click()
  await expect(page.getByText('Nothing found in the record')).toBeVisible()
})

test('a zone temperature changed in the editor moves the reading and is stored', async ({
  page,
  isMobile,
}) => {
  await register(page, newPerson())
  await layOutAircraft(page, 'Warm project')
  await openChannel(page, 'EGT 1')
  await logRun(page)
  await page.getByRole('radio', { name: /Climb/ }).check({ force: true })
  await page.getByRole('button', { name: /Zone temperatures/ }).click()
  const stored = page.waitForResponse(
    (answer) => answer.request().method() === 'PUT' && answer.url().includes('/temperatures/'),
  )
  await page.getByLabel('Exhaust 1, Climb').fill('655,5')
  expect((await stored).status()).toBe(200)
  if (isMobile) await page.getByRole('button', { name: 'Done' }).click()
  await expect(
    page
      .getByText(/655\.5/)
      .filter({ visible: true })
      .first(),
  ).toBeVisible()
  await page.getByRole('link', { name: 'Zones and states' }).click()
  if (isMobile) await page.getByRole('combobox', { name: 'Operating state' }).selectOption({ label: 'Climb' })
  await expect(page.getByLabel(/Exhaust 1, Climb/)).toHaveValue('655.5')
})
