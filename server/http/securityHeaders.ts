/** What a page may load and do: its own files, the inline scripts we wrote ourselves, and nothing else. */
function pagePolicy(nonce: string): Record<string, string> {
  return {
    'default-src': "'self'",
    'script-src': `'self' 'nonce-${nonce}'`,
    'style-src': "'self'",
    'img-src': "'self' data:",
    'object-src': "'none'",
    'base-uri': "'none'",
    'form-action': "'self'",
    'frame-ancestors': "'none'",
  }
}

/** The development server puts styles into the page and speaks to it over a socket. */
const DEVELOPMENT_POLICY = { 'style-src': "'self' 'unsafe-inline'", 'connect-src': "'self' ws: wss:" }

/** Data are never a page, whatever a browser makes of them. */
const DATA_POLICY = { 'default-src': "'none'", 'base-uri': "'none'", 'frame-ancestors': "'none'" }

const UNUSED_FEATURES = ['camera', 'display-capture', 'geolocation', 'microphone', 'payment', 'usb']
const HALF_A_YEAR_SECONDS = 182 * 24 * 60 * 60

export interface HeaderFacts {
  path: string
  nonce: string
  isHttps: boolean
  isDevelopment: boolean
}

/** The security headers of one answer. */
export function securityHeaders({
  path,
  nonce,
  isHttps,
  isDevelopment,
}: HeaderFacts): Record<string, string> {
  const page = { ...pagePolicy(nonce), ...(isDevelopment && DEVELOPMENT_POLICY) }
  return {
    'content-security-policy': policyText(path.startsWith('/api/') ? DATA_POLICY : page),
    'cross-origin-opener-policy': 'same-origin',
    'cross-origin-resource-policy': 'same-origin',
    'permissions-policy': UNUSED_FEATURES.map((feature) => `${feature}=()`).join(', '),
    'referrer-policy': 'same-origin',
    'x-content-type-options': 'nosniff',
    'x-frame-options': 'DENY',
    // Over plain http, as on loopback, browsers ignore it and readers would be misled.
    ...(isHttps && { 'strict-transport-security': `max-age=${HALF_A_YEAR_SECONDS}` }),
  }
}

function policyText(policy: Record<string, string>): string {
  return Object.entries(policy)
    .map(([directive, sources]) => `${directive} ${sources}`)
    .join('; ')
}

/** Marks the scripts in a piece of a page's frame as ours. The frame holds what Nuxt wrote, never what a person did. */
export function withNonce(html: string, nonce: string): string {
  return html.replace(/<script(?=[\s>])/g, `<script nonce="${nonce}"`)
}
