import { randomBytes } from 'node:crypto'
import { getRequestProtocol, setResponseHeaders } from 'h3'
import { defineNitroPlugin, useRuntimeConfig } from '#imports'
import { securityHeaders, withNonce } from '~~/server/http/securityHeaders'

declare module 'h3' {
  interface H3EventContext {
    scriptNonce?: string
  }
}

/** Every answer gets its security headers before anything else looks at the request. */
export default defineNitroPlugin((nitro) => {
  nitro.hooks.hook('request', (event) => {
    const nonce = randomBytes(16).toString('base64')
    event.context.scriptNonce = nonce
    const { behindProxy } = useRuntimeConfig(event)
    const isHttps = getRequestProtocol(event, { xForwardedProto: behindProxy }) === 'https'
    const isDevelopment = import.meta.dev === true
    setResponseHeaders(event, securityHeaders({ path: event.path, nonce, isHttps, isDevelopment }))
  })
  nitro.hooks.hook('render:html', (html, { event }) => {
    const nonce = event.context.scriptNonce ?? ''
    for (const part of ['head', 'bodyPrepend', 'bodyAppend'] as const) {
      html[part] = html[part].map((piece) => withNonce(piece, nonce))
    }
  })
  nitro.hooks.hook('render:response', (response) => {
    delete response.headers?.['x-powered-by']
  })
})
