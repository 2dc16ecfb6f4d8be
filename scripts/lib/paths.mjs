import path from 'node:path'
import { fileURLToPath } from 'node:url'

/** The checkout this script belongs to, wherever it was called from. */
export const rootFolder = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../..')

/** Everything a running installation keeps: databases, secrets, logs. Ignored by git. */
export const dataFolder = path.join(rootFolder, '.data')

/** A program that came with an npm package. @param {string} name */
export function packageProgram(name) {
  return path.join(rootFolder, 'node_modules', '.bin', name)
}

/** @param {string} file an absolute path inside the checkout */
export function shown(file) {
  const relative = path.relative(rootFolder, file)
  return relative && !relative.startsWith('..') ? relative : file
}
