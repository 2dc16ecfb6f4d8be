import type { LocationQueryValue } from 'vue-router'

/** Where to go after signing in: only a path of this site, never another host. */
export function nextPath(next: LocationQueryValue | LocationQueryValue[] | undefined): string {
  return typeof next === 'string' && /^\/(?![/\\])/.test(next) ? next : '/aircraft'
}
