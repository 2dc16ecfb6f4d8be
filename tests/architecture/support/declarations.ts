import ts from 'typescript'
import type { SourceFile } from './sources'
import { codeOf } from './sources'

export interface FunctionFacts {
  path: string
  name: string
  isExported: boolean
  hasDocstring: boolean
  lines: number
}

type FunctionNode = ts.FunctionDeclaration | ts.FunctionExpression | ts.ArrowFunction | ts.MethodDeclaration

/** Every function of a file, named ones and those that stand inside others. */
export function functionsOf(file: SourceFile): FunctionFacts[] {
  const parsed = ts.createSourceFile(file.path, codeOf(file), ts.ScriptTarget.Latest, true, ts.ScriptKind.TS)
  const found: FunctionFacts[] = []
  const visit = (node: ts.Node): void => {
    if (isFunction(node)) found.push(factsOf(node, parsed, file.path))
    ts.forEachChild(node, visit)
  }
  visit(parsed)
  return found
}

function isFunction(node: ts.Node): node is FunctionNode {
  return (
    ts.isFunctionDeclaration(node) ||
    ts.isFunctionExpression(node) ||
    ts.isArrowFunction(node) ||
    ts.isMethodDeclaration(node)
  )
}

function factsOf(node: FunctionNode, parsed: ts.SourceFile, path: string): FunctionFacts {
  const statement = statementOf(node)
  const first = parsed.getLineAndCharacterOfPosition(node.getStart(parsed)).line
  const last = parsed.getLineAndCharacterOfPosition(node.getEnd()).line
  return {
    path,
    name: nameOf(node) ?? `the function at line ${first + 1}`,
    isExported: statement !== undefined && isExported(statement),
    hasDocstring: statement !== undefined && ts.getJSDocCommentsAndTags(statement).length > 0,
    lines: last - first + 1,
  }
}

/** The statement that declares a function at the top of a file, as `function f` or as `const f = …`. */
function statementOf(node: FunctionNode): ts.Statement | undefined {
  if (ts.isFunctionDeclaration(node)) return node
  const { parent } = node
  if (!ts.isVariableDeclaration(parent) || !ts.isVariableStatement(parent.parent.parent)) return undefined
  return parent.parent.parent
}

function nameOf(node: FunctionNode): string | undefined {
  if (node.name) return node.name.getText()
  return ts.isVariableDeclaration(node.parent) ? node.parent.name.getText() : undefined
}

function isExported(statement: ts.Statement): boolean {
  const modifiers = ts.canHaveModifiers(statement) ? ts.getModifiers(statement) : undefined
  return modifiers?.some(({ kind }) => kind === ts.SyntaxKind.ExportKeyword) ?? false
}
