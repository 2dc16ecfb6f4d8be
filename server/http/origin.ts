import type { H3Event } from 'h3'
import { getRequestHeader, getRequestHost } from 'h3'
import { AppError } from './appError'

const SAFE_METHODS = new Set(['GET', 'HEAD', 'OPTIONS'])
const OWN_SITES = new Set(['same-origin', 'none'])

/**
 * Refuses a write that a browser sends on behalf of another site. The session cookie is lax already; this also holds
 * for a sibling subdomain, which counts as the same site. Clients other than browsers send neither header.
 */
export function requireOwnOrigin(event: H3Event): void {
  if (SAFE_METHODS.has(event.method)) return
  const site = getRequestHeader(event, 'sec-fetch-site')
  if (site !== undefined) {
    if (!OWN_SITES.has(site)) throw foreign()
    return
  }
  const origin = getRequestHeader(event, 'origin')
  if (origin !== undefined && hostOf(origin) !== getRequestHost(event)) throw foreign()
}

function hostOf(origin: string): string | undefined {
  return URL.canParse(origin) ? new URL(origin).host : undefined
}

function foreign(): AppError {
  return new AppError('forbidden', 'Writes are accepted from the pages of this site only.')
}
