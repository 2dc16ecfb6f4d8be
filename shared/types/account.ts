import type { Preferences } from '../schemas/account'

/** An account as its own holder sees it. */
export interface Account {
  id: number
  email: string
  displayName: string
  preferences: Preferences
}
