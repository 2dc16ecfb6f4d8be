import type { Role } from '#shared/domain/permissions'

export interface DemoPerson {
  email: string
  displayName: string
}

/** Printed by `npm start`: the demo is there to be looked into, so its accounts keep nothing secret. */
export const DEMO_PASSWORD = 'cowlbook-demo'

/** Invented people, one for each role; `.invalid` is reserved, so no such address can ever exist (RFC 2606). */
export const DEMO_PEOPLE: Readonly<Record<Role, DemoPerson>> = {
  owner: { displayName: 'Orla Quillfeather', email: 'owner@demo.cowlbook.invalid' },
  builder: { displayName: 'Bram Tinderlake', email: 'builder@demo.cowlbook.invalid' },
  inspector: { displayName: 'Inga Stonewick', email: 'inspector@demo.cowlbook.invalid' },
  mentor: { displayName: 'Milo Farrowgate', email: 'mentor@demo.cowlbook.invalid' },
}
