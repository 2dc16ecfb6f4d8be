import { expect, test } from '@playwright/test'
import { newPerson, open, register, signIn } from './support/pages'

test('a page of the workbook leads to sign-in and back again', async ({ page, context }) => {
  const person = newPerson()
  await register(page, person)
  await context.clearCookies()
  await page.goto('/account')
  await expect(page).toHaveURL(/\/sign-in\?next=/)
  await signIn(page, person.email, 'not the password')
  await expect(page.getByRole('alert')).toBeVisible()
  await expect(page.getByLabel('E-mail address')).toHaveValue(person.email)
  await page.goto('/account')
  await page.getByLabel('E-mail address').fill(person.email)
  await page.getByLabel('Password').fill(person.password)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await expect(page.getByRole('heading', { name: person.name })).toBeVisible()
})

test('a new password ends every other session and leaves this one', async ({ page, browser, baseURL }) => {
  const person = newPerson()
  await register(page, person)
  const elsewhere = await browser.newContext({ baseURL })
  const other = await elsewhere.newPage()
  await signIn(other, person.email, person.password)
  await expect(other.getByRole('heading', { name: 'Your aircraft' })).toBeVisible()

  await open(page, '/account')
  await page.getByLabel('Current password').fill(person.password)
  await page.getByLabel('New password').fill('another long secret')
  await page.getByRole('button', { name: 'Change the password' }).click()
  await expect(page.getByText(/The password is changed/)).toBeVisible()
  await page.reload()
  await expect(page.getByRole('heading', { name: person.name })).toBeVisible()
  await other.reload()
  await expect(other).toHaveURL(/\/sign-in/)
  await elsewhere.close()
})

test('a form says what is wrong, keeps what was typed and leads to the field', async ({ page }) => {
  await open(page, '/register')
  await page.getByLabel('E-mail address').fill('nobody')
  await page.getByLabel('Password').fill('short')
  await page.getByRole('button', { name: 'Create the account' }).click()
  const summary = page.getByRole('alert')
  await expect(summary).toBeFocused()
  await summary.getByRole('link', { name: /at least 8 characters/ }).click()
  await expect(page.getByLabel('Password')).toBeFocused()
  await expect(page.getByLabel('E-mail address')).toHaveValue('nobody')
})

test('units chosen stay chosen', async ({ page }) => {
  await register(page, newPerson())
  const kept = page.waitForResponse((answer) => answer.request().method() === 'PATCH')
  await page.getByLabel('Temperature unit').selectOption('fahrenheit')
  expect((await kept).status()).toBe(200)
  await page.reload()
  await expect(page.getByLabel('Temperature unit')).toHaveValue('fahrenheit')
})
