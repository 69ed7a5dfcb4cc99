/** The token in a pasted invitation: the whole link, its path, or the token alone. Null when it is none. */
export function tokenIn(pasted: string): string | null {
  const text = pasted.trim()
  const found = /\/join\/([\w-]+)\/?(?:[?#].*)?$/.exec(text)?.[1] ?? text
  return /^[\w-]{20,200}$/.test(found) ? found : null
}
