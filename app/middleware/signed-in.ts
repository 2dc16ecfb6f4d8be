import { useAccountStore } from '~/stores/account'

/** Pages of the workbook: leads to sign-in and back again. */
export default defineNuxtRouteMiddleware((to) => {
  if (!useAccountStore().account) return navigateTo({ path: '/sign-in', query: { next: to.fullPath } })
})
