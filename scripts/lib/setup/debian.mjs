import { accessSync, constants, existsSync, rmSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { Failure } from '../failure.mjs'
import { lastLines, runToEnd } from '../child-processes.mjs'
import { onTeardown } from '../teardown.mjs'
import { step } from '../progress.mjs'

/** @typedef {{ title: string, packages: string[], programs: string[], service?: string }} DebianNeed */

/** @type {DebianNeed} */
export const MARIADB = {
  title: 'MariaDB server',
  packages: ['mariadb-server'],
  programs: ['mariadbd', 'mariadb-install-db'],
  service: 'mariadb.service',
}

/** @type {DebianNeed} */
export const CHROMIUM = { title: 'Chromium', packages: ['chromium'], programs: ['chromium'] }

const SERVICE_POLICY_FILE = '/usr/sbin/policy-rc.d'
// Server programs live in sbin, which is not in the search path of a normal user.
const EXTRA_FOLDERS = ['/usr/sbin', '/usr/local/sbin', '/sbin', '/usr/bin']

/**
 * @param {string} name
 * @returns {string | undefined} its path
 */
export function findProgram(name) {
  const folders = [...(process.env.PATH ?? '').split(path.delimiter), ...EXTRA_FOLDERS]
  return folders
    .filter(Boolean)
    .map((folder) => path.join(folder, name))
    .find(isExecutable)
}

/** @param {string} file */
function isExecutable(file) {
  try {
    accessSync(file, constants.X_OK)
    return true
  } catch {
    return false
  }
}

/** Installs what is missing from Debian, as root; as anyone else says what is missing. @param {DebianNeed} need */
export function ensureFromDebian(need) {
  return step(need.title, async (note) => {
    if (need.programs.every(findProgram)) return note('already installed')
    const command = `apt-get install --no-install-recommends ${need.packages.join(' ')}`
    if (process.getuid?.() !== 0) {
      throw new Failure(`${need.title} is not installed, and only root can install it.`, {
        todo: `Run this once, then start again:\nsudo apt-get update && sudo ${command}`,
      })
    }
    if (!findProgram('apt-get')) {
      throw new Failure(`${need.title} is not installed, and this machine has no apt-get.`, {
        todo: `Install it so that these programs are found: ${need.programs.join(', ')}`,
      })
    }
    note('installing from Debian')
    await install(need)
    const missing = need.programs.filter((program) => !findProgram(program))
    if (missing.length > 0) {
      throw new Failure(`${need.title} was installed, but ${missing.join(' and ')} cannot be found.`, {
        todo: `Look at what this says: ${command}`,
      })
    }
    note('installed from Debian')
  })
}

/** @param {DebianNeed} need */
async function install({ packages, service }) {
  const allowServices = forbidServiceStarts()
  try {
    await apt(['update'])
    await apt(['install', '--yes', '--no-install-recommends', ...packages])
    // We run a private instance; the one for the whole machine must not come up at the next boot either.
    if (service && findProgram('systemctl')) await runToEnd('systemctl', ['disable', service])
  } finally {
    allowServices()
  }
}

/** @param {string[]} parameters */
async function apt(parameters) {
  const { code, output } = await runToEnd('apt-get', ['-o', 'DPkg::Lock::Timeout=120', ...parameters], {
    env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
  })
  if (code === 0) return
  throw new Failure(`apt-get ${parameters[0]} failed.`, {
    todo: 'Check the network and the Debian package sources (/etc/apt), then start again.',
    detail: lastLines(output),
  })
}

/** Debian starts a service as soon as its package is installed, unless this policy forbids it. */
function forbidServiceStarts() {
  if (existsSync(SERVICE_POLICY_FILE)) return () => {}
  writeFileSync(SERVICE_POLICY_FILE, '#!/bin/sh\nexit 101\n', { mode: 0o755 })
  const remove = () => rmSync(SERVICE_POLICY_FILE, { force: true })
  const forget = onTeardown('the service policy', remove)
  return () => {
    forget()
    remove()
  }
}
