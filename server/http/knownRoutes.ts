import { ROUTES } from '#shared/domain/permissions'

const PATTERNS = Object.keys(ROUTES).map((key) => {
  const [method = '', path = ''] = key.split(' ')
  return { method, path: new RegExp(`^${path.replace(/:\w+/g, '[^/]+')}$`) }
})

/** True when the table of routes has a row for this method and path. */
export function isKnownRoute(method: string, path: string): boolean {
  return PATTERNS.some((pattern) => pattern.method === method && pattern.path.test(path))
}
