import { readFileSync } from 'node:fs'

// Positions in /proc/<pid>/stat, counted from the field after the name.
const PARENT = 1
const BIRTH = 19

/**
 * @param {number} pid
 * @returns {string[]} nothing when there is no such process
 */
function statusFields(pid) {
  try {
    // The name in brackets may hold spaces and brackets; the fields counted here come after it.
    return readFileSync(`/proc/${pid}/stat`, 'utf8')
      .replace(/^.*\) /s, '')
      .split(' ')
  } catch {
    return []
  }
}

/**
 * When a process was born, in kernel ticks. Process numbers are used again; a number together with its birth is not.
 * @param {number} pid
 * @returns {string | undefined}
 */
export function birthOf(pid) {
  return statusFields(pid)[BIRTH]
}

/**
 * @param {number} pid
 * @returns {string | undefined}
 */
export function parentOf(pid) {
  return statusFields(pid)[PARENT]
}
