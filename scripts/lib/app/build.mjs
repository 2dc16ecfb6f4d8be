import { existsSync } from 'node:fs'
import { readFile, writeFile } from 'node:fs/promises'
import path from 'node:path'
import { Failure } from '../failure.mjs'
import { packageProgram } from '../paths.mjs'
import { lastLines, runToEnd } from '../child-processes.mjs'
import { requireFreeSpace } from '../setup/disk.mjs'
import { fingerprint } from './fingerprint.mjs'

const SOURCES = [
  'app',
  'server',
  'shared',
  'public',
  'modules',
  'nuxt.config.ts',
  'tailwind.config.ts',
  'tsconfig.json',
  'package.json',
  'package-lock.json',
]
const NEEDED_MEGABYTES = 300

/** The built server. @param {string} root */
export function builtServer(root) {
  return path.join(root, '.output', 'server', 'index.mjs')
}

/**
 * Builds the application unless the build at hand was made from exactly these sources.
 * @param {string} root
 * @returns {Promise<string>} what was done
 */
export async function ensureBuild(root) {
  // Inside the output folder, so that every other build, which empties that folder, makes it unknown again.
  const stampFile = path.join(root, '.output', 'cowlbook-sources')
  const sources = await fingerprint(root, SOURCES, [process.versions.node])
  const stamp = await readFile(stampFile, 'utf8').catch(() => '')
  if (stamp === sources && existsSync(builtServer(root))) return 'up to date'
  await requireFreeSpace(root, NEEDED_MEGABYTES, 'the build')
  await nuxt(root, 'build')
  await writeFile(stampFile, sources)
  return 'built'
}

/** Writes the types that Nuxt generates, on which the TypeScript configuration stands. @param {string} root */
export function prepareNuxt(root) {
  return nuxt(root, 'prepare')
}

/** @param {string} root @param {'build' | 'prepare'} command */
async function nuxt(root, command) {
  const { code, output } = await runToEnd(packageProgram('nuxt'), [command], {
    cwd: root,
    env: { ...process.env, NODE_ENV: 'production', NUXT_TELEMETRY_DISABLED: '1' },
  })
  if (code === 0) return
  throw new Failure(`nuxt ${command} failed.`, {
    where: root,
    todo: 'The reason is in the lines below.',
    detail: lastLines(output, 40),
  })
}
