/** Names enough to act on; a message that lists forty joints is not read. */
const NAMED = 3

/** `a`, `a and b`, `a, b and c`, `a, b, c and 5 more`. */
export function nameSome(names: readonly string[]): string {
  const named = names.slice(0, NAMED)
  const rest = names.length - named.length
  const parts = rest > 0 ? [...named, `${rest} more`] : named
  const last = parts.at(-1) ?? ''
  return parts.length < 2 ? last : `${parts.slice(0, -1).join(', ')} and ${last}`
}
