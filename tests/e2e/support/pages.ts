import type { Page } from '@playwright/test'
import { expect } from '@playwright/test'

declare global {
  interface Window {
    useNuxtApp?: () => { isHydrating?: boolean }
  }
}

/** Opens a page and waits until it answers to input. */
export async function open(page: Page, path: string): Promise<void> {
  await page.goto(path)
  await ready(page)
}

export async function ready(page: Page): Promise<void> {
  await page.waitForFunction(() => window.useNuxtApp?.().isHydrating === false)
}

export interface NewPerson {
  email: string
  name: string
  password: string
}

let count = 0

/** Somebody nobody has seen before. */
export function newPerson(): NewPerson {
  count += 1
  const unique = `${Date.now().toString(36)}-${process.pid}-${count}`
  return { email: `person-${unique}@example.org`, name: `Person ${count}`, password: 'a long enough secret' }
}

export async function register(page: Page, person: NewPerson): Promise<void> {
  await open(page, '/register')
  await page.getByLabel('E-mail address').fill(person.email)
  await page.getByLabel('Your name').fill(person.name)
  await page.getByLabel('Password').fill(person.password)
  await page.getByRole('button', { name: 'Create the account' }).click()
  await expect(page.getByRole('heading', { name: 'Your aircraft' })).toBeVisible()
}

export async function signIn(page: Page, email: string, password: string): Promise<void> {
  await open(page, '/sign-in')
  await page.getByLabel('E-mail address').fill(email)
  await page.getByLabel('Password').fill(password)
  await page.getByRole('button', { name: 'Sign in' }).click()
}

/** Lays out a small aircraft and leaves the page on its sheet. */
export async function layOutAircraft(page: Page, name: string): Promise<void> {
  await open(page, '/aircraft/new')
  await page.getByLabel('Name of the project').fill(name)
  await page.getByRole('button', { name: 'Lay out the aircraft' }).click()
  await expect(page.getByRole('heading', { name, level: 1 })).toBeVisible()
}

/** From anywhere on an aircraft to one of its channels. */
export async function openChannel(page: Page, tag: string): Promise<void> {
  await page.getByRole('link', { name: 'Channels', exact: true }).click()
  await expect(page.getByRole('heading', { name: 'Channels', level: 1 })).toBeVisible()
  await page.getByRole('link', { name: tag }).filter({ visible: true }).first().click()
  await expect(page.getByRole('heading', { name: tag, level: 1 })).toBeVisible()
}

/** Logs the proposed run of the channel that is open, as it is. */
export async function logRun(page: Page): Promise<void> {
  await page.getByRole('link', { name: 'Log the wiring run' }).click()
  await expect(page.getByRole('heading', { name: 'The run, tip to terminals' })).toBeVisible()
  await page.getByRole('button', { name: 'Save the run' }).click()
  await expect(page.getByText('● Saved')).toBeVisible()
}
