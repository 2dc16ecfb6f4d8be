import { defineStore } from 'pinia'
import type { ChangePasswordInput, Preferences, RegisterInput, SignInInput } from '#shared/schemas/account'
import type { Account } from '#shared/types/account'
import { problemOf, useApi } from '~/composables/api/useApi'
import { useUnitsStore } from './units'

/** Who is signed in, as the server says. */
export const useAccountStore = defineStore('account', () => {
  const api = useApi()
  const units = useUnitsStore()
  const account = ref<Account | null>(null)
  const loaded = ref(false)

  function hold(answer: { account: Account }): void {
    account.value = answer.account
    units.use(answer.account.preferences)
  }

  /** Asks the server once per visit; somebody not signed in is an answer, not an error. */
  async function load(): Promise<void> {
    if (loaded.value) return
    try {
      hold(await api.get<{ account: Account }>('/api/account'))
    } catch (error) {
      if (problemOf(error).code !== 'unauthenticated') throw error
    }
    loaded.value = true
  }

  async function register(input: RegisterInput): Promise<void> {
    hold(await api.post<{ account: Account }>('/api/auth/register', input))
  }

  async function signIn(input: SignInInput): Promise<void> {
    hold(await api.post<{ account: Account }>('/api/auth/sign-in', input))
  }

  async function signOut(): Promise<void> {
    await api.post('/api/auth/sign-out', {})
    account.value = null
  }

  async function changePassword(input: ChangePasswordInput): Promise<void> {
    await api.post('/api/account/password', input)
  }

  /** Takes effect at once; for somebody signed in the account keeps it. */
  async function choosePreferences(choice: Preferences): Promise<void> {
    units.use(choice)
    if (account.value) hold(await api.patch<{ account: Account }>('/api/account/preferences', choice))
  }

  return { account, loaded, load, register, signIn, signOut, changePassword, choosePreferences }
})
