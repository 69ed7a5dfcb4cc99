import { uuidV7 } from '#shared/utils/uuid'

/** When every simulated story begins. */
export const START = Date.UTC(2026, 5, 1)

/** Ids that are the same in every run of a schedule. */
export function countingIds(): () => string {
  let count = 0
  return () => {
    count += 1
    const bytes = new Uint8Array(16)
    new DataView(bytes.buffer).setUint32(12, count)
    return uuidV7(START + count, bytes)
  }
}
