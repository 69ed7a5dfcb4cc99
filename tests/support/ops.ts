import type { Op } from '#shared/sync/protocol'
import { countingIds } from '../simulation/support/ids'

export const DEVICE = '0197f000-0000-7000-8000-00000000000a'
const nextId = countingIds()

/** An operation with everything filled in that a test does not speak of. */
export function makeOp(part: Partial<Op> = {}): Op {
  return {
    opId: nextId(), deviceId: DEVICE, deviceSeq: 1, schema: 1, kind: 'patch', entityType: 'entry', entityId: nextId(), baseVer: 1, fields: {}, ...part,
  }
}
