import type { Role } from '#shared/domain/permissions'

export interface DemoPerson {
  email: string
  displayName: string
  role: Role
}

/** Printed by `npm start`: the demo is there to be looked into, so its accounts keep nothing secret. */
export const DEMO_PASSWORD = 'cowlbook-demo'

/** Invented people; `.invalid` is reserved so that no such address can ever exist (RFC 2606). */
export const DEMO_OWNER: DemoPerson = {
  email: 'owner@demo.cowlbook.invalid',
  displayName: 'Orla Quillfeather',
  role: 'owner',
}

export const DEMO_BUILDER: DemoPerson = {
  email: 'builder@demo.cowlbook.invalid',
  displayName: 'Bram Tinderlake',
  role: 'builder',
}

export const DEMO_INSPECTOR: DemoPerson = {
  email: 'inspector@demo.cowlbook.invalid',
  displayName: 'Inga Stonewick',
  role: 'inspector',
}

export const DEMO_MENTOR: DemoPerson = {
  email: 'mentor@demo.cowlbook.invalid',
  displayName: 'Milo Farrowgate',
  role: 'mentor',
}
