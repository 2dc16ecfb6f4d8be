import path from 'node:path'
import ts from 'typescript'
import type { SourceFile } from './sources'
import { codeOf } from './sources'

const ALIASES: [string, string][] = [
  ['#shared/', 'shared/'],
  ['#server/', 'server/'],
  ['~~/', ''],
  ['@@/', ''],
  ['~/', 'app/'],
  ['@/', 'app/'],
]

export interface Import {
  /** As written. */
  specifier: string
  /** Path from the root for our own files, without an ending; the specifier itself for packages. */
  target: string
  isOwn: boolean
  /** Names brought in as values; types vanish when the code is compiled and bind nothing. */
  values: string[]
}

/** Everything a file imports, re-exports or imports on demand. */
export function importsOf(file: SourceFile): Import[] {
  const parsed = ts.createSourceFile(file.path, codeOf(file), ts.ScriptTarget.Latest, true, ts.ScriptKind.TS)
  const found: Import[] = []
  const visit = (node: ts.Node): void => {
    const specifier = specifierOf(node)
    if (specifier !== undefined) {
      found.push({ specifier, ...resolve(file.path, specifier), values: valuesOf(node) })
    }
    ts.forEachChild(node, visit)
  }
  visit(parsed)
  return found
}

function specifierOf(node: ts.Node): string | undefined {
  const written =
    ts.isImportDeclaration(node) || ts.isExportDeclaration(node) ? node.moduleSpecifier : undefined
  if (written && ts.isStringLiteral(written)) return written.text
  if (!ts.isCallExpression(node) || node.expression.kind !== ts.SyntaxKind.ImportKeyword) return undefined
  const [argument] = node.arguments
  return argument && ts.isStringLiteralLike(argument) ? argument.text : undefined
}

function valuesOf(node: ts.Node): string[] {
  if (!ts.isImportDeclaration(node) || node.importClause?.isTypeOnly) return []
  const bindings = node.importClause?.namedBindings
  const standard = node.importClause?.name ? ['default'] : []
  if (!bindings) return standard
  if (ts.isNamespaceImport(bindings)) return [...standard, '*']
  const named = bindings.elements.filter((element) => !element.isTypeOnly)
  return [...standard, ...named.map((element) => (element.propertyName ?? element.name).text)]
}

function resolve(from: string, specifier: string): { target: string; isOwn: boolean } {
  if (specifier.startsWith('.')) {
    return { target: path.posix.normalize(path.posix.join(path.posix.dirname(from), specifier)), isOwn: true }
  }
  const alias = ALIASES.find(([prefix]) => specifier.startsWith(prefix))
  if (!alias) return { target: specifier, isOwn: false }
  return { target: alias[1] + specifier.slice(alias[0].length), isOwn: true }
}
