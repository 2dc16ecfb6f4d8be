import type { H3Event } from 'h3'
import { getRequestIP } from 'h3'
import { useRuntimeConfig } from '#imports'

/** Where a request comes from, for limits by address. */
export function clientAddress(event: H3Event): string {
  const { behindProxy } = useRuntimeConfig(event)
  return getRequestIP(event, { xForwardedFor: behindProxy }) ?? 'unknown'
}
