import { sha256Of } from '#server/utils/sha256'

/** The same name gives the same id, so that planting the demo twice plants it once. */
export function demoId(name: string): string {
  const hex = sha256Of(`demo/${name}`)
  return [hex.slice(0, 8), hex.slice(8, 12), `7${hex.slice(13, 16)}`, `8${hex.slice(17, 20)}`, hex.slice(20, 32)].join('-')
}
