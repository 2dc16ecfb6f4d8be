import { useAccountStore } from '~/stores/account'

/** Knows who is signed in before any page is drawn, so that nothing jumps. */
export default defineNuxtRouteMiddleware(async () => {
  await useAccountStore().load()
})
