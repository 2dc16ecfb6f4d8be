import { existsSync, readFileSync, readdirSync } from 'node:fs'
import path from 'node:path'
import { fileURLToPath } from 'node:url'

export const rootFolder = fileURLToPath(new URL('../../..', import.meta.url))

export interface SourceFile {
  /** From the root of the checkout, with forward slashes, e.g. `app/pages/index.vue`. */
  path: string
  text: string
}

/** Every file below the given folders whose name ends in one of the endings. */
export function sourcesBelow(folders: string[], endings = ['.ts', '.vue', '.mjs']): SourceFile[] {
  return folders
    .flatMap(pathsBelow)
    .filter((name) => endings.some((ending) => name.endsWith(ending)))
    .map((name) => ({ path: name, text: readFileSync(path.join(rootFolder, name), 'utf8') }))
}

/** Every folder at or below the given ones, with the number of files that lie in it directly. */
export function folderSizes(folders: string[]): { path: string; files: number }[] {
  const counts = new Map<string, number>()
  for (const file of folders.flatMap(pathsBelow)) {
    const folder = path.posix.dirname(file)
    counts.set(folder, (counts.get(folder) ?? 0) + 1)
  }
  return [...counts].map(([name, files]) => ({ path: name, files }))
}

/** Lines as an editor counts them. */
export function lineCount(text: string): number {
  return text.trimEnd().split('\n').length
}

/** The code of a file: all of it, or what stands between the script tags of a component. */
export function codeOf({ path: name, text }: SourceFile): string {
  if (!name.endsWith('.vue')) return text
  return [...text.matchAll(/<script\b[^>]*>([\s\S]*?)<\/script>/g)].map((match) => match[1]).join('\n')
}

function pathsBelow(folder: string): string[] {
  if (!existsSync(path.join(rootFolder, folder))) return []
  return readdirSync(path.join(rootFolder, folder), { withFileTypes: true }).flatMap((entry) => {
    const name = `${folder}/${entry.name}`
    return entry.isDirectory() ? pathsBelow(name) : [name]
  })
}
