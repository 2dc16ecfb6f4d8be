import AxeBuilder from '@axe-core/playwright'
import type { Page } from '@playwright/test'
import { expect, test } from '@playwright/test'
import { ready, signIn } from './support/pages'

const PUBLIC = [
  '/',
  '/register',
  '/sign-in',
  '/bench',
  '/bench/thermocouple',
  '/bench/thermocouple/table',
  '/bench/run',
  '/nowhere',
]
const WORKBOOK = [
  '/account',
  '/aircraft',
  '/aircraft/new',
  '/aircraft/1',
  '/aircraft/1/channels',
  '/aircraft/1/channels/new',
  '/aircraft/1/channels/1',
  '/aircraft/1/channels/2',
  '/aircraft/1/channels/1/run',
  '/aircraft/1/channels/1/probe',
  '/aircraft/1/channels/1/edit',
  '/aircraft/1/zones',
  '/aircraft/1/displays',
  '/aircraft/1/displays/new',
  '/aircraft/1/displays/1',
  '/aircraft/1/history',
  '/aircraft/1/settings',
]

/** What a page must never do: ask another host, break the content policy, or draw itself twice. */
function watchForTrouble(page: Page, baseURL: string): string[] {
  const troubles: string[] = []
  page.on('request', (request) => {
    const { protocol, origin } = new URL(request.url())
    if (protocol.startsWith('http') && origin !== new URL(baseURL).origin)
      troubles.push(`asks ${request.url()}`)
  })
  page.on('console', (message) => {
    if (/Content Security Policy|Hydration|Vue warn/.test(message.text())) troubles.push(message.text())
  })
  page.on('pageerror', (error) => troubles.push(error.message))
  return troubles
}

/** What axe objects to. Pages have no frames of other origins, so its quicker mode sees all of them. */
async function findingsOfAxe(page: Page, rules?: string[]): Promise<string[]> {
  const builder = new AxeBuilder({ page }).setLegacyMode(true).options({ resultTypes: ['violations'] })
  const { violations } = await (rules ? builder.withRules(rules) : builder).analyze()
  return violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ target }) => target.join(' ')).join(', ')}`)
}

/** One page by day with every rule, then by night (at the desk) for what the colours alone can spoil. */
async function examine(page: Page, path: string, alsoByNight: boolean): Promise<void> {
  // Colours on their way from day to night are neither: without motion there is no way to catch them there.
  await page.emulateMedia({ colorScheme: 'light', reducedMotion: 'reduce' })
  await page.goto(path)
  await ready(page)
  const sideways = await page.evaluate(
    () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
  )
  expect.soft(sideways, `${path} scrolls sideways`).toBeLessThanOrEqual(0)
  expect.soft(await findingsOfAxe(page), `${path} by axe`).toEqual([])
  if (!alsoByNight) return
  await page.emulateMedia({ colorScheme: 'dark', reducedMotion: 'reduce' })
  expect.soft(await findingsOfAxe(page, ['color-contrast']), `${path} by axe, night sheet`).toEqual([])
}

test.describe('every page is accessible, self-contained and fits the screen', () => {
  test.setTimeout(240_000)

  test('in public', async ({ page, baseURL, isMobile }) => {
    const troubles = watchForTrouble(page, baseURL ?? '')
    for (const path of PUBLIC) await examine(page, path, !isMobile)
    expect(troubles).toEqual([])
  })

  test('in the workbook', async ({ page, baseURL, isMobile }) => {
    await signIn(page, 'owner@demo.cowlbook.invalid', 'cowlbook-demo')
    await expect(page.getByRole('heading', { name: 'Your aircraft' })).toBeVisible()
    const troubles = watchForTrouble(page, baseURL ?? '')
    for (const path of WORKBOOK) await examine(page, path, !isMobile)
    expect(troubles).toEqual([])
  })
})

test('a demo inspector sees the aircraft and none of the controls that change it', async ({ page }) => {
  await signIn(page, 'inspector@demo.cowlbook.invalid', 'cowlbook-demo')
  await expect(page.getByRole('heading', { name: 'Your aircraft' })).toBeVisible()
  await page.goto('/aircraft/1/channels/1')
  await expect(page.getByRole('heading', { name: 'EGT 1' })).toBeVisible()
  await expect(page.getByRole('link', { name: 'Edit the run' })).toHaveCount(0)
  await page.goto('/aircraft/1/channels/1/run')
  await expect(page).toHaveURL(/\/channels\/1$/)
})
