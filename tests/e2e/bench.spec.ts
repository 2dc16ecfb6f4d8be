import { expect, test } from '@playwright/test'
import { open } from './support/pages'

test('the calculator answers both ways, keeps its state in the address and names its range', async ({
  page,
}) => {
  await open(page, '/bench/thermocouple')
  const result = page.getByRole('main')
  await expect(result.getByText('12.209')).toBeVisible()

  await page.getByLabel('Cold junction').fill('25')
  await expect(result.getByText('11.208')).toBeVisible()
  await expect(page).toHaveURL(/coldJunctionCelsius=25/)

  await page.getByLabel('the emf at the terminals').check()
  await page.getByRole('textbox', { name: 'emf at the terminals' }).fill('−0,798')
  await page.getByLabel('Cold junction').fill('20')
  await expect(result.getByText(/^−?0\.0[01]/)).toBeVisible()

  await page.reload()
  await expect(page.getByRole('textbox', { name: 'emf at the terminals' })).toHaveValue('-0.798')

  await page.getByLabel('Type', { exact: true }).selectOption('T')
  await page.getByRole('textbox', { name: 'emf at the terminals' }).fill('99')
  await expect(page.getByRole('alert')).toContainText('outside its range')
})

test('the calculator counts in °F where asked', async ({ page }) => {
  await open(page, '/bench/thermocouple?type=K&celsius=100')
  await page.getByLabel('Temperature unit').selectOption('fahrenheit')
  await expect(page.getByLabel('Tip temperature')).toHaveValue('212')
  await expect(page.getByRole('main').getByText('4.096')).toBeVisible()
})

test('the table is printable and refuses what is no table', async ({ page }) => {
  await open(page, '/bench/thermocouple/table?type=K&unit=celsius&from=0&to=100&step=1&coldJunction=0')
  await expect(page.getByRole('row', { name: /^30 / })).toContainText('1.203')
  await page.getByLabel('Step').fill('0')
  await expect(page.getByRole('alert')).toContainText('above zero')
})

test('the sandbox needs no account and shows a copper extension at once', async ({ page, isMobile }) => {
  await open(page, '/bench/run')
  await expect(page.getByText('Nothing found in the record')).toBeVisible()
  await page.getByRole('button', { name: /^═? ?Extension/ }).click()
  await page.getByLabel('Cable').selectOption('copper')
  if (isMobile) await page.getByRole('button', { name: 'Done' }).click()
  await expect(
    page
      .getByText(/stray junction/i)
      .filter({ visible: true })
      .first(),
  ).toBeVisible()
  await page.getByRole('button', { name: 'Start over' }).click()
  await expect(page.getByText('Nothing found in the record')).toBeVisible()
})

test('the sandbox can be worked by keyboard alone', async ({ page }) => {
  await page.setViewportSize({ width: 1280, height: 800 })
  await open(page, '/bench/run')
  const extension = page.getByRole('button', { name: /^═? ?Extension/ })
  await extension.focus()
  await page.keyboard.press('Enter')
  await page.keyboard.press('Tab')
  await page.keyboard.press('Tab')
  await expect(page.getByLabel('Cable')).toBeFocused()
  await page.keyboard.type('Copper')
  await expect(
    page
      .getByText(/stray junction/i)
      .filter({ visible: true })
      .first(),
  ).toBeVisible()
})
