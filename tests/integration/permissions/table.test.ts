import { readdirSync, readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { may, PERMISSIONS, ROLES, ROUTES } from '#shared/domain/permissions'

const FOLDER = 'server/api'
const files = readdirSync(FOLDER, { recursive: true, encoding: 'utf8' })
  .filter((name) => name.endsWith('.ts'))
  .map((name) => `${FOLDER}/${name}`)

/** The key Nitro's naming gives a file: `aircraft/[aircraftId]/zones/index.get.ts`. */
function keyOf(path: string): string {
  const [, route = '', method = ''] = /^server\/api\/(.*)\.(\w+)\.ts$/.exec(path) ?? []
  const withIds = route.replace(/\[(\w+)\]/g, ':$1').replace(/(^|\/)index$/, '')
  return `${method.toUpperCase()} /api/${withIds}`
}

describe('the table of routes', () => {
  it('has a row for every file, and a file for every row', () => {
    expect(files.length).toBeGreaterThan(30)
    expect(files.map(keyOf).sort()).toEqual(Object.keys(ROUTES).sort())
  })

  it.each(files.map((path) => [keyOf(path), path]))('%s wraps its own handler', (key, path) => {
    const text = readFileSync(path, 'utf8')
    expect(text).toContain(`export default defineApiRoute('${key}',`)
  })

  it('names the aircraft wherever a permission on it is demanded', () => {
    const demanding = Object.entries(ROUTES).filter(([, access]) => access in PERMISSIONS)
    expect(demanding.filter(([key]) => !key.includes('/api/aircraft/:aircraftId'))).toEqual([])
    const open = Object.entries(ROUTES).filter(([key]) => key.includes('/api/aircraft/:aircraftId'))
    expect(open.filter(([, access]) => !(access in PERMISSIONS))).toEqual([])
  })

  it.each(Object.keys(PERMISSIONS) as (keyof typeof PERMISSIONS)[])(
    '%s is held by some role',
    (permission) => {
      expect(ROLES.filter((role) => may([role], permission)).length).toBeGreaterThan(0)
      expect(may([], permission)).toBe(false)
    },
  )
})
