/** Where somebody goes who asked for nothing in particular. */
export const HOME = '/today'

/**
 * The page to go to after signing in, as an address may ask for it. Only a path
 * of this site is followed: "//elsewhere", "/\elsewhere" and an address with a
 * hidden line break lead somewhere else in a browser.
 */
export function safeNext(asked: unknown): string {
  if (typeof asked !== 'string' || !/^\/(?![/\\])[^\\\p{Cc}]*$/u.test(asked)) return HOME
  const address = new URL(asked, 'https://stillroot.invalid')
  if (address.pathname.startsWith('//')) return HOME
  // Back to the form one comes from would look as if nothing had happened.
  return /^\/sign-(?:in|up)(?:\/|$)/.test(address.pathname) ? HOME : asked
}
