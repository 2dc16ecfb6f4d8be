import type { Import } from './imports'
import { importsOf } from './imports'
import type { SourceFile } from './sources'

interface Rule {
  name: string
  /** Folder whose files the rule binds. */
  within: string
  forbids: (imported: Import) => boolean
}

const DATABASE_PACKAGES = ['drizzle-orm', 'mysql2', 'drizzle-kit']

const isBelow = (target: string, ...folders: string[]) =>
  folders.some((folder) => target === folder || target.startsWith(`${folder}/`))

const isDatabasePackage = ({ isOwn, target }: Import) => !isOwn && isBelow(target, ...DATABASE_PACKAGES)

/** They compute nothing: they look up what is known of a conductor. */
const LOOK_UPS = new Set(['thermoelementInfo', 'legsOf'])

/** Functions are named in lower case; constants and types are not, and any screen may use those. */
const bringsInPhysics = ({ target, values }: Import) =>
  isBelow(target, 'shared/thermometry') && values.some((name) => /^[a-z*]/.test(name) && !LOOK_UPS.has(name))

export const RULES: Rule[] = [
  {
    name: 'shared/ stands alone: it imports itself and zod only',
    within: 'shared',
    forbids: ({ isOwn, target }) => (isOwn ? !isBelow(target, 'shared') : target !== 'zod'),
  },
  {
    name: 'the browser never imports the server',
    within: 'app',
    forbids: (imported) => isBelow(imported.target, 'server') || isDatabasePackage(imported),
  },
  {
    name: 'the server never imports the browser',
    within: 'server',
    forbids: ({ isOwn, target }) => isOwn && isBelow(target, 'app'),
  },
  {
    name: 'routes reach the database through services only',
    within: 'server/api',
    forbids: (imported) =>
      isDatabasePackage(imported) || isBelow(imported.target, 'server/db', 'server/repositories'),
  },
  {
    name: 'services know nothing of routes',
    within: 'server/services',
    forbids: ({ target }) => isBelow(target, 'server/api'),
  },
  {
    name: 'repositories know nothing of services and routes',
    within: 'server/repositories',
    forbids: ({ target }) => isBelow(target, 'server/api', 'server/services'),
  },
  {
    name: 'the database layer knows nothing above it',
    within: 'server/db',
    forbids: ({ target }) => isBelow(target, 'server/api', 'server/services', 'server/repositories'),
  },
  ...['app/components', 'app/pages', 'app/layouts'].map((within) => ({
    name: `${within} leave the physics to composables and stores`,
    within,
    forbids: bringsInPhysics,
  })),
]

/** What a file imports against a rule, one line for each. */
export function violations(rule: Rule, file: SourceFile): string[] {
  if (!isBelow(file.path, rule.within)) return []
  return importsOf(file)
    .filter(rule.forbids)
    .map(({ specifier, values }) => `${file.path} imports ${values.join(', ')} from ${specifier}`)
}
