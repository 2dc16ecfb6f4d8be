import { registerEndpoint } from '@nuxt/test-utils/runtime'
import { setResponseStatus } from 'h3'

/** Nobody is signed in: every start of the application asks who is. */
registerEndpoint('/api/account', (event) => {
  setResponseStatus(event, 401)
  return {
    type: 'about:blank',
    title: 'Not signed in',
    status: 401,
    detail: 'Sign in.',
    code: 'unauthenticated',
  }
})
