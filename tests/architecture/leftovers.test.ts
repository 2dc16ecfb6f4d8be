import { describe, expect, it } from 'vitest'
import type { SourceFile } from './support/sources'
import { sourcesBelow } from './support/sources'

/** Written in two halves, so that this file does not find itself. */
const word = (...halves: string[]) => halves.join('')

const FORBIDDEN_EVERYWHERE = [
  new RegExp(String.raw`\b${word('TO', 'DO')}\b`),
  new RegExp(String.raw`\b${word('FIX', 'ME')}\b`),
  new RegExp(word('@ts-', '(ignore|nocheck|expect-error)')),
  new RegExp(word('eslint', '-disable')),
  new RegExp(word('prettier', '-ignore')),
  new RegExp(word('/wo', 'rk/')),
]

const LEFT_OUT = [
  word('sk', 'ip'),
  word('sk', 'ipIf'),
  word('run', 'If'),
  word('on', 'ly'),
  'todo',
  word('fix', 'me'),
]

const FORBIDDEN_IN_TESTS = [
  new RegExp(String.raw`\b(it|test|describe|suite)(\.\w+)*\.(${LEFT_OUT.join('|')})\b`),
  new RegExp(String.raw`\b(${word('x', 'it')}|${word('x', 'describe')}|${word('f', 'describe')})\(`),
]

function found(patterns: RegExp[], files: SourceFile[]): string[] {
  return files.flatMap(({ path, text }) =>
    text
      .split('\n')
      .flatMap((line, index) =>
        patterns.some((pattern) => pattern.test(line)) ? [`${path}:${index + 1}: ${line.trim()}`] : [],
      ),
  )
}

describe('leftovers', () => {
  const ENDINGS = ['.ts', '.vue', '.mjs', '.css', '.sql']

  it('no notes to ourselves and no silenced checks anywhere', () => {
    const files = sourcesBelow(['app', 'server', 'shared', 'scripts', 'tests', 'drizzle'], ENDINGS)
    expect(found(FORBIDDEN_EVERYWHERE, files)).toEqual([])
  })

  it('no test is left out', () => {
    expect(found(FORBIDDEN_IN_TESTS, sourcesBelow(['tests']))).toEqual([])
  })

  it.each([
    word('// TO', 'DO: later'),
    word('// @ts-', 'ignore'),
    word('/* eslint', '-disable */'),
    word('see /wo', 'rk/notes'),
  ])('notices %s', (line) => {
    expect(found(FORBIDDEN_EVERYWHERE, [{ path: 'a.ts', text: line }])).toHaveLength(1)
  })

  it.each([
    word('it.sk', "ip('x', () => {})"),
    word('test.on', "ly('x', () => {})"),
    word('describe.sk', "ipIf(true)('x', () => {})"),
    word('x', "it('x', () => {})"),
    word('test.fix', "me('x')"),
  ])('notices %s', (line) => {
    expect(found(FORBIDDEN_IN_TESTS, [{ path: 'a.test.ts', text: line }])).toHaveLength(1)
  })
})
