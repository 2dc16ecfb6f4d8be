/** Name of the cookie that carries the sealed session. */
export const SESSION_COOKIE = 'cowlbook-session'

/** A session ends by itself after this long, however it is used. */
export const SESSION_SECONDS = 14 * 24 * 60 * 60
