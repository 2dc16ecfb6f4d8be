const HEARTBEAT_MILLISECONDS = 15_000
const TITLE_WIDTH = 22
const NOTE_WIDTH = 52

/** @param {number} milliseconds */
export function elapsedText(milliseconds) {
  const seconds = milliseconds / 1000
  if (seconds < 60) return `${seconds.toFixed(1)} s`
  return `${Math.floor(seconds / 60)} min ${Math.round(seconds % 60)} s`
}

/**
 * Runs one step and prints one line for it, with the time it took. A step that takes long says so every now and
 * then, so that nobody takes a slow mirror for a hang.
 * @template T
 * @param {string} title
 * @param {(note: (text: string) => void) => Promise<T> | T} work
 * @returns {Promise<T>}
 */
export async function step(title, work) {
  const begin = Date.now()
  let remark = ''
  const heartbeat = setInterval(() => {
    console.log(
      `  … ${title.padEnd(TITLE_WIDTH)} ${remark || 'still working'}, ${elapsedText(Date.now() - begin)}`,
    )
  }, HEARTBEAT_MILLISECONDS)
  try {
    const result = await work((text) => {
      remark = text
    })
    print('✓', title, remark, begin)
    return result
  } catch (error) {
    print('✗', title, 'failed', begin)
    throw error
  } finally {
    clearInterval(heartbeat)
  }
}

/** @param {string} mark @param {string} title @param {string} remark @param {number} begin */
function print(mark, title, remark, begin) {
  const elapsed = elapsedText(Date.now() - begin)
  console.log(`  ${mark} ${title.padEnd(TITLE_WIDTH)} ${remark.padEnd(NOTE_WIDTH)} ${elapsed}`)
}
